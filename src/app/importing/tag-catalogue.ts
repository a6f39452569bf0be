import { httpResource } from '@angular/common/http';
import { computed, Injectable, signal } from '@angular/core';
import type { BenchView } from '@shared/contracts/benches';
import type { BuildSummary } from '@shared/contracts/builds';
import type { ProductSummary, ProductView } from '@shared/contracts/products';

/** What is known in the team already: the words that the tags of an import are chosen from. */
@Injectable()
export class TagCatalogue {
  private readonly place = signal<{ team: string; product: string } | undefined>(undefined);

  readonly products = httpResource<ProductSummary[]>(() => this.ofTeam('/api/v1/products?team='), { defaultValue: [] });
  readonly benches = httpResource<BenchView[]>(
    () => {
      const place = this.place();
      return place && `/api/teams/${encodeURIComponent(place.team)}/benches`;
    },
    { defaultValue: [] },
  );
  private readonly product = httpResource<ProductView>(() => this.ofProduct(''));
  private readonly builds = httpResource<BuildSummary[]>(() => this.ofProduct('/builds'), { defaultValue: [] });

  /** Products that take sweeps: those of the team itself. */
  readonly ownProducts = computed(() =>
    this.products.hasValue() ? this.products.value().filter(({ isShared }) => !isShared) : [],
  );
  readonly openBenches = computed(() =>
    this.benches.hasValue() ? this.benches.value().filter(({ isArchived }) => !isArchived) : [],
  );
  readonly chosen = computed(() => (this.product.hasValue() ? this.product.value() : undefined));
  readonly states = computed(() => this.chosen()?.states.map(({ name }) => name) ?? []);
  readonly units = computed(() => this.chosen()?.units ?? []);
  /** Newest first. */
  readonly knownBuilds = computed(() => (this.builds.hasValue() ? [...this.builds.value()].reverse() : []));
  readonly hardware = computed(() => [...new Set(this.knownBuilds().map((build) => build.hardware))]);
  readonly firmware = computed(() => [...new Set(this.knownBuilds().map((build) => build.firmware))]);

  look(team: string, product: string): void {
    const place = this.place();
    if (place?.team !== team || place.product !== product) this.place.set({ team, product });
  }

  private ofTeam(path: string): string | undefined {
    const place = this.place();
    return place && `${path}${encodeURIComponent(place.team)}`;
  }

  private ofProduct(path: string): string | undefined {
    const place = this.place();
    if (!place?.product) return undefined;
    return `/api/v1/products/${encodeURIComponent(place.product)}${path}?team=${encodeURIComponent(place.team)}`;
  }
}
