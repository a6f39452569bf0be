import { httpResource } from '@angular/common/http';
import { computed, inject, Injectable } from '@angular/core';
import { toSignal } from '@angular/core/rxjs-interop';
import { ActivatedRoute } from '@angular/router';
import type { BuildView } from '@shared/contracts/builds';
import type { DropSummary } from '@shared/contracts/drops';
import type { VerdictsView } from '@shared/contracts/judging';
import type { SweepPage } from '@shared/contracts/sweeps';
import { keptValue } from '../kept-value';
import { problemOfResource } from '../problem-of-resource';
import { ProductInView } from '../product-in-view';
import type { ComparedBuild } from './changes-table';
import { dropsShownBy } from './drops-shown-by';

/** Everything a page says about the build of the address. */
@Injectable()
export class BuildInView {
  private readonly product = inject(ProductInView);
  private readonly path = toSignal(inject(ActivatedRoute).paramMap, { requireSync: true });
  private readonly id = computed(() => Number(this.path().get('build')));

  private readonly buildAnswer = httpResource<BuildView>(() => this.buildRequest(this.id()));
  /** Gone as soon as the address names another build, so that nothing of two builds mixes. */
  readonly build = computed(() => {
    const build = this.kept();
    return build?.id === this.id() ? build : undefined;
  });
  private readonly kept = keptValue(this.buildAnswer);

  private readonly verdictsAnswer = httpResource<VerdictsView>(() => {
    const build = this.build();
    if (!build) return undefined;
    const { hardware, firmware } = build;
    return { url: `${this.product.api()}/verdicts`, params: { ...this.product.apiTeam(), hardware, firmware } };
  });
  readonly judged = keptValue(this.verdictsAnswer);

  private readonly dropsAnswer = httpResource<DropSummary[]>(() => ({
    url: `${this.product.api()}/drops`,
    params: this.product.apiTeam(),
  }));
  private readonly drops = keptValue(this.dropsAnswer);
  readonly shownDrops = computed(() => {
    const drops = this.drops();
    return drops && dropsShownBy(drops, this.id());
  });

  private readonly sweepsAnswer = httpResource<SweepPage>(() => ({
    url: '/api/v1/sweeps',
    params: { ...this.product.apiTeam(), product: this.product.key(), build: this.id(), kind: 'product', limit: 200 },
  }));
  readonly sweeps = keptValue(this.sweepsAnswer);

  /** The newest of the builds that were pooled, or the one that was chosen. */
  readonly referenceId = computed(() => this.judged()?.referenceBuilds.at(-1)?.id);
  private readonly referenceAnswer = httpResource<BuildView>(() => this.buildRequest(this.referenceId()));
  private readonly previousAnswer = httpResource<BuildView>(() => this.buildRequest(this.build()?.previous?.id));

  readonly compared = computed((): ComparedBuild[] => {
    const build = this.build();
    if (!build) return [];
    const reference = this.referenceAnswer.hasValue() ? this.referenceAnswer.value() : undefined;
    const previous = this.previousAnswer.hasValue() ? this.previousAnswer.value() : undefined;
    const isSame = reference?.id === previous?.id;
    return [
      ...(reference ? [{ role: isSame ? 'Reference and build before' : 'Reference', build: reference }] : []),
      ...(previous && !isSame ? [{ role: 'Build before', build: previous }] : []),
      { role: 'This build', build },
    ];
  });

  readonly buildProblem = problemOfResource(this.buildAnswer);
  private readonly otherProblems = [this.verdictsAnswer, this.dropsAnswer, this.sweepsAnswer].map((answer) =>
    problemOfResource(answer),
  );
  readonly partProblem = computed(
    () => this.otherProblems.map((problem) => problem()).find((problem) => problem) ?? null,
  );

  reload(): void {
    for (const answer of [this.buildAnswer, this.verdictsAnswer, this.dropsAnswer, this.sweepsAnswer]) answer.reload();
  }

  private buildRequest(id: number | undefined) {
    if (id === undefined) return undefined;
    return { url: `${this.product.api()}/builds/${id}`, params: this.product.apiTeam() };
  }
}
