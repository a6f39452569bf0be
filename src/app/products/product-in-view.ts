import { httpResource } from '@angular/common/http';
import { computed, inject, Injectable } from '@angular/core';
import { toSignal } from '@angular/core/rxjs-interop';
import { ActivatedRoute } from '@angular/router';
import { type Action, leastRole } from '@shared/access/permissions';
import type { BuildSummary } from '@shared/contracts/builds';
import type { ProductView } from '@shared/contracts/products';
import { CurrentTeam } from '../session/current-team';
import { keptValue } from './kept-value';
import { problemOfResource } from './problem-of-resource';

/** The product of the address, for the page that provides it and all parts below. `?owner=` names the owning team of a shared one. */
@Injectable()
export class ProductInView {
  private readonly route = inject(ActivatedRoute);
  private readonly currentTeam = inject(CurrentTeam);
  private readonly path = toSignal(this.route.paramMap, { requireSync: true });
  private readonly query = toSignal(this.route.queryParamMap, { requireSync: true });

  /** Team whose pages are open; for a shared product not the owner. */
  readonly team = computed(() => this.path().get('team') ?? '');
  readonly key = computed(() => this.path().get('product') ?? '');
  readonly owner = computed(() => this.query().get('owner') ?? this.team());
  readonly isShared = computed(() => this.owner() !== this.team());

  /** Router commands to the product's page, and the query every link to it carries. */
  readonly link = computed(() => ['/t', this.team(), 'products', this.key()]);
  readonly linkQuery = computed(() => (this.isShared() ? { owner: this.owner() } : {}));

  readonly api = computed(() => `/api/v1/products/${encodeURIComponent(this.key())}`);
  readonly apiTeam = computed(() => ({ team: this.owner() }));

  private readonly productAnswer = httpResource<ProductView>(() => ({ url: this.api(), params: this.apiTeam() }));
  private readonly buildsAnswer = httpResource<BuildSummary[]>(() => ({
    url: `${this.api()}/builds`,
    params: this.apiTeam(),
  }));
  readonly product = keptValue(this.productAnswer);
  /** Oldest first. */
  readonly builds = keptValue(this.buildsAnswer);
  /** Whether there is any sweep to draw; undefined before the product is known. */
  readonly isMeasured = computed(() => {
    const product = this.product();
    return product && product.lines.length > 0;
  });
  readonly productProblem = problemOfResource(this.productAnswer);
  readonly buildsProblem = problemOfResource(this.buildsAnswer);

  may(action: Action): boolean {
    return !this.isShared() && this.currentTeam.may(action);
  }

  /** Why the person may not do it here, in one sentence; empty when they may. */
  whyNot(action: Action): string {
    if (this.may(action)) return '';
    if (this.isShared()) return 'The product is shared with your team to read only.';
    return `This takes the role ${leastRole(action)} or more in the team.`;
  }

  reload(): void {
    this.productAnswer.reload();
    this.buildsAnswer.reload();
  }
}
