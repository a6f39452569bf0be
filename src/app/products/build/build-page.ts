import { ChangeDetectionStrategy, Component, computed, effect, inject } from '@angular/core';
import { MatButton } from '@angular/material/button';
import { MatIcon } from '@angular/material/icon';
import { MatTooltip } from '@angular/material/tooltip';
import { Title } from '@angular/platform-browser';
import { RouterLink } from '@angular/router';
import { MarginValue } from '../../ui/margin-value';
import { PageHeader } from '../../ui/page-header';
import { ProblemBanner } from '../../ui/problem-banner';
import { Skeleton } from '../../ui/skeleton';
import { TimeStamp } from '../../ui/time-stamp';
import { VerdictChip } from '../../ui/verdict-chip';
import { JudgeNow } from '../judge-now';
import { ProductDialogs } from '../product-dialogs';
import { ProductInView } from '../product-in-view';
import { BuildInView } from './build-in-view';
import { buildAnswer, marginSentence, mostUseful, referenceWords } from './build-answer';
import { ChangesTable } from './changes-table';
import { DropList } from './drop-list';
import { SweepList } from './sweep-list';
import { verdictCounts } from './verdict-rows';
import { VerdictTable } from './verdict-table';

/** One build: the answer first, then what it rests on. */
@Component({
  selector: 'app-build-page',
  imports: [
    ChangesTable,
    DropList,
    JudgeNow,
    MarginValue,
    MatButton,
    MatIcon,
    MatTooltip,
    PageHeader,
    ProblemBanner,
    RouterLink,
    Skeleton,
    SweepList,
    TimeStamp,
    VerdictChip,
    VerdictTable,
  ],
  providers: [BuildInView, ProductDialogs, ProductInView],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './build-page.html',
  styleUrl: './build-page.scss',
})
export class BuildPage {
  private readonly dialogs = inject(ProductDialogs);
  protected readonly view = inject(ProductInView);
  protected readonly page = inject(BuildInView);

  protected readonly name = computed(() => {
    const build = this.page.build();
    return build ? `${build.hardware} / ${build.firmware}` : 'Build';
  });
  protected readonly targetMarginDb = computed(() => this.view.product()?.targetMarginDb ?? 0);
  protected readonly answer = computed(() => {
    const [build, judged, drops] = [this.page.build(), this.page.judged(), this.page.shownDrops()];
    return build && judged && drops && judged.buildId === build.id ? buildAnswer(build, judged, drops) : undefined;
  });
  protected readonly marginWords = computed(() => {
    const build = this.page.build();
    return build && marginSentence(build.worstMarginDb, build.worstFrequencyHz, this.targetMarginDb());
  });
  protected readonly counts = computed(() => verdictCounts(this.page.judged()?.verdicts ?? []));
  protected readonly mostUseful = computed(() => mostUseful(this.page.judged()?.verdicts ?? []));
  protected readonly reference = computed(() => {
    const judged = this.page.judged();
    return judged && judged.referenceBuilds.length > 0 ? referenceWords(judged) : '';
  });
  /** Builds of the overlay that answers "what changed": this one, the reference and the one before. */
  protected readonly overlayQuery = computed(() => {
    const build = this.page.build();
    const ids = [build?.id, this.page.referenceId(), build?.previous?.id].filter((id) => id !== undefined);
    return { ...this.view.linkQuery(), builds: [...new Set(ids)].join(',') };
  });

  constructor() {
    const title = inject(Title);
    effect(() => {
      const product = this.view.product();
      if (product && this.page.build()) title.setTitle(`${this.name()}, ${product.name} · Strandline`);
    });
  }

  protected async edit(): Promise<void> {
    const build = this.page.build();
    if (build && (await this.dialogs.editBuild(build))) this.reload();
  }

  protected async chooseReference(): Promise<void> {
    const build = this.page.build();
    if (build && (await this.dialogs.chooseReference(build))) this.reload();
  }

  protected reload(): void {
    this.view.reload();
    this.page.reload();
  }
}
