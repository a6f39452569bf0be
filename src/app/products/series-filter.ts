import { ChangeDetectionStrategy, Component, computed, inject, input } from '@angular/core';
import { MatFormFieldModule } from '@angular/material/form-field';
import { MatSelectModule } from '@angular/material/select';
import { DETECTORS } from '@shared/detectors/detectors';
import type { ProductView } from '@shared/contracts/products';
import { AddressQuery } from './address-query';
import type { SeriesChoice } from './series-choice';

/** Operating state, line and detector to look at; the choice lives in the address. Further fields go inside the tag. */
@Component({
  selector: 'app-series-filter',
  imports: [MatFormFieldModule, MatSelectModule],
  changeDetection: ChangeDetectionStrategy.OnPush,
  host: { class: 'filter-row no-print' },
  template: `
    <mat-form-field class="state">
      <mat-label>Operating state</mat-label>
      <mat-select [value]="choice().state ?? any" (valueChange)="choose({ state: $event || null })">
        <mat-option [value]="any">{{ anyText('states') }}</mat-option>
        @for (state of product().states; track state.id) {
          <mat-option [value]="state.name">{{ state.name }}</mat-option>
        }
      </mat-select>
    </mat-form-field>
    <mat-form-field class="short">
      <mat-label>Line</mat-label>
      <mat-select [value]="choice().line ?? any" (valueChange)="choose({ line: $event || null })">
        <mat-option [value]="any">{{ anyText('lines') }}</mat-option>
        @for (line of product().lines; track line) {
          <mat-option [value]="line">{{ line }}</mat-option>
        }
      </mat-select>
    </mat-form-field>
    <mat-form-field class="short">
      <mat-label>Detector</mat-label>
      <mat-select [value]="choice().detector ?? any" (valueChange)="choose({ detector: $event || null })">
        <mat-option [value]="any">{{ anyText('detectors') }}</mat-option>
        @for (detector of detectors(); track detector) {
          <mat-option [value]="detector">{{ detector }}</mat-option>
        }
      </mat-select>
    </mat-form-field>
    <ng-content />
  `,
  styleUrl: './series-filter.scss',
})
export class SeriesFilter {
  private readonly address = inject(AddressQuery);

  readonly product = input.required<ProductView>();
  readonly choice = input.required<SeriesChoice>();
  /** Where nothing is chosen, the series that is shown instead of all. */
  readonly closest = input<SeriesChoice | null>(null);

  /** NOTE: a select shows no text for null, which it takes for "nothing chosen". */
  protected readonly any = '';

  protected readonly detectors = computed(() => DETECTORS.filter((name) => this.product().detectors.includes(name)));

  protected anyText(names: 'states' | 'lines' | 'detectors'): string {
    const closest = this.closest();
    if (!closest) return `All ${names}`;
    const name = { states: closest.state, lines: closest.line, detectors: closest.detector }[names];
    return name === undefined ? 'closest' : `closest: ${name}`;
  }

  protected choose(part: { state?: string | null; line?: string | null; detector?: string | null }): void {
    this.address.patch(part);
  }
}
