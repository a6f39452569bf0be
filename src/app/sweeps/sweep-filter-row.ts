import { httpResource } from '@angular/common/http';
import { ChangeDetectionStrategy, Component, computed, input, output } from '@angular/core';
import { MatButton } from '@angular/material/button';
import { MatFormFieldModule } from '@angular/material/form-field';
import { MatSelectModule } from '@angular/material/select';
import type { BenchView } from '@shared/contracts/benches';
import type { BuildSummary } from '@shared/contracts/builds';
import type { ProductSummary, ProductView } from '@shared/contracts/products';
import { DETECTORS, LINES, SWEEP_KINDS } from '@shared/detectors/detectors';
import { KIND_WORDS } from '../ui/kind-words';
import type { SweepFilter, SweepFilterName } from './sweep-filter';

interface Choice {
  name: SweepFilterName;
  label: string;
  options: readonly { key: string; words: string }[];
}

const LINE_OPTIONS = LINES.map((line) => ({ key: line, words: line }));
const DETECTOR_OPTIONS = DETECTORS.map((detector) => ({ key: detector, words: detector }));
const KIND_OPTIONS = SWEEP_KINDS.map((kind) => ({ key: kind, words: KIND_WORDS[kind] }));

/** What the list of sweeps can be narrowed by; builds and states once a product is chosen. */
@Component({
  selector: 'app-sweep-filter-row',
  imports: [MatButton, MatFormFieldModule, MatSelectModule],
  changeDetection: ChangeDetectionStrategy.OnPush,
  host: { class: 'filter-row' },
  template: `
    @for (choice of choices(); track choice.name) {
      <mat-form-field [class]="choice.name">
        <mat-label>{{ choice.label }}</mat-label>
        <mat-select [value]="shown()[choice.name] ?? ''" (valueChange)="choose(choice.name, $event)">
          <mat-option value="">All</mat-option>
          @for (option of choice.options; track option.key) {
            <mat-option [value]="option.key">{{ option.words }}</mat-option>
          }
        </mat-select>
      </mat-form-field>
    }
    @if (isNarrowed()) {
      <button mat-button type="button" (click)="cleared.emit()">Show all</button>
    }
  `,
  styles: `
    .mat-mdc-form-field {
      width: 132px;
    }
    .product {
      width: 192px;
    }
    .line {
      width: 100px;
    }
    .detector {
      width: 124px;
    }
  `,
})
export class SweepFilterRow {
  readonly team = input.required<string>();
  /** The team that owns the chosen product. */
  readonly owner = input.required<string>();
  readonly products = input.required<readonly ProductSummary[]>();
  readonly filter = input.required<SweepFilter>();
  readonly changed = output<Partial<Record<SweepFilterName, string | null>>>();
  readonly cleared = output();

  private readonly benches = httpResource<BenchView[]>(() => `/api/teams/${encodeURIComponent(this.team())}/benches`);
  private readonly product = httpResource<ProductView>(() => this.ofProduct(''));
  private readonly builds = httpResource<BuildSummary[]>(() => this.ofProduct('/builds'));

  protected readonly shown = computed((): Partial<Record<SweepFilterName, string>> => {
    const { build, ...texts } = this.filter();
    return { ...texts, ...(build !== undefined && { build: String(build) }) };
  });
  protected readonly isNarrowed = computed(() => Object.keys(this.filter()).length > 0);

  protected readonly choices = computed((): Choice[] => {
    const products = this.products().map(({ key, name }) => ({ key, words: name }));
    const choices: Choice[] = [{ name: 'product', label: 'Product', options: products }];
    if (this.filter().product !== undefined) {
      const builds = this.builds.hasValue() ? [...this.builds.value()].reverse() : [];
      const states = this.product.hasValue() ? this.product.value().states : [];
      choices.push(
        {
          name: 'build',
          label: 'Build',
          options: builds.map(({ id, hardware, firmware }) => ({
            key: String(id),
            words: `${hardware} / ${firmware}`,
          })),
        },
        { name: 'state', label: 'State', options: states.map(({ name }) => ({ key: name, words: name })) },
      );
    }
    const benches = this.benches.hasValue() ? this.benches.value() : [];
    return [
      ...choices,
      { name: 'bench', label: 'Bench', options: benches.map(({ key, name }) => ({ key, words: name })) },
      { name: 'line', label: 'Line', options: LINE_OPTIONS },
      { name: 'detector', label: 'Detector', options: DETECTOR_OPTIONS },
      { name: 'kind', label: 'Role', options: KIND_OPTIONS },
    ];
  });

  protected choose(name: SweepFilterName, key: string): void {
    this.changed.emit({ [name]: key || null });
  }

  private ofProduct(path: string): string | undefined {
    const { product } = this.filter();
    if (product === undefined) return undefined;
    return `/api/v1/products/${encodeURIComponent(product)}${path}?team=${encodeURIComponent(this.owner())}`;
  }
}
