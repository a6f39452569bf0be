import { httpResource } from '@angular/common/http';
import { ChangeDetectionStrategy, Component, computed, effect, inject, input, linkedSignal } from '@angular/core';
import { MatButton } from '@angular/material/button';
import { MatIcon } from '@angular/material/icon';
import { Title } from '@angular/platform-browser';
import { Params, Router, RouterLink } from '@angular/router';
import type { DropView } from '@shared/contracts/drops';
import type { OverlayTrace } from '@shared/contracts/sweeps';
import { decodeFrames } from '@shared/traces/frames';
import { saveFile } from '../ui/chart/save-file';
import type { SpectrumView } from '../ui/chart/spectrum-types';
import { toCsv } from '../ui/chart/to-csv';
import { problemOf } from '../ui/problem';
import { ProblemBanner } from '../ui/problem-banner';
import { Skeleton } from '../ui/skeleton';
import { TEAM_TIME_ZONE } from '../ui/team-time-zone';
import { ActsBlock } from './acts-block';
import { AnswerStrip } from './answer-strip';
import { ChangedBlock } from './changed-block';
import { addressOfView, viewOfAddress } from './chart-address';
import { DropHead } from './drop-head';
import { LeftBlock } from './left-block';
import { type OverlayScene, overlayScene, sweepsToDraw, witnessNamed } from './overlay-scene';
import { PassOnSheet } from './pass-on-sheet';
import { RealBlock } from './real-block';
import { WhereBlock } from './where-block';
import { witnessRows } from './witness-rows';

/** One drop: the sentence, then the five questions in the order people ask them. On paper it is the pass-on sheet. */
@Component({
  selector: 'app-drop-page',
  imports: [
    ActsBlock,
    AnswerStrip,
    ChangedBlock,
    DropHead,
    LeftBlock,
    MatButton,
    MatIcon,
    PassOnSheet,
    ProblemBanner,
    RealBlock,
    RouterLink,
    Skeleton,
    WhereBlock,
  ],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './drop-page.html',
  styleUrl: './drop-page.scss',
})
export class DropPage {
  private readonly title = inject(Title);
  private readonly router = inject(Router);
  private readonly timeZone = inject(TEAM_TIME_ZONE);

  /** From the address; the chart's view and series stand there too, so that a link shows what I see. */
  readonly team = input.required<string>();
  readonly id = input.required<string>();
  readonly series = input<string>();
  readonly runs = input<string>();
  readonly from = input<string>();
  readonly to = input<string>();
  readonly pins = input<string>();

  protected readonly answer = httpResource<DropView>(() => `/api/v1/drops/${encodeURIComponent(this.id())}`);
  protected readonly drop = computed(() => (this.answer.hasValue() ? this.answer.value() : undefined));
  protected readonly problem = computed(() => {
    const error = this.answer.error();
    return error && problemOf(error);
  });

  protected readonly witness = computed(() => {
    const drop = this.drop();
    return drop && witnessNamed(drop, this.series());
  });
  protected readonly isEveryRun = computed(() => this.runs() === 'all');
  private readonly overlay = httpResource.arrayBuffer(() => {
    const drop = this.drop();
    const witness = this.witness();
    if (!drop || !witness) return undefined;
    const sweeps = sweepsToDraw(witness, this.isEveryRun()).join(',');
    const params = { team: drop.team, product: drop.product, sweeps, kind: 'background' };
    return { url: '/api/v1/overlay', params };
  });
  protected readonly overlayProblem = computed(() => {
    const error = this.overlay.error();
    return error && problemOf(error);
  });
  /** While the next picture is on its way the one before stays. */
  protected readonly scene = linkedSignal<OverlayScene | undefined, OverlayScene | undefined>({
    source: () => {
      const drop = this.drop();
      const witness = this.witness();
      if (!drop || !witness || !this.overlay.hasValue()) return undefined;
      return overlayScene(drop, witness, decodeFrames<OverlayTrace>(this.overlay.value()), this.timeZone());
    },
    computation: (now, before) => now ?? before?.value,
  });
  protected readonly view = computed(() => viewOfAddress({ from: this.from(), to: this.to(), pins: this.pins() }), {
    equal: (one, other) => JSON.stringify(one) === JSON.stringify(other),
  });

  constructor() {
    effect(() => {
      const drop = this.drop();
      if (drop) this.title.setTitle(`${drop.hardware} / ${drop.firmware}, ${drop.band} · Drop · Strandline`);
    });
  }

  /** What the server answered to a move is the drop as it stands. */
  protected show(drop: DropView): void {
    this.answer.set(drop);
  }

  protected showSeries(series: string): void {
    this.patchAddress({ series });
  }

  protected showEveryRun(isEveryRun: boolean): void {
    this.patchAddress({ runs: isEveryRun ? 'all' : null });
  }

  protected keepView(view: SpectrumView): void {
    this.patchAddress(addressOfView(view));
  }

  protected reload(): void {
    this.answer.reload();
  }

  protected print(): void {
    window.print();
  }

  protected saveWitnesses(drop: DropView): void {
    const csv = new Blob([toCsv(witnessRows(drop))], { type: 'text/csv' });
    saveFile(`drop-${drop.id}-witnesses.csv`, csv);
  }

  private patchAddress(queryParams: Params): void {
    void this.router.navigate([], {
      queryParams,
      queryParamsHandling: 'merge',
      replaceUrl: true,
      scroll: 'manual',
    });
  }
}
