import { ChangeDetectionStrategy, Component, inject, input, output } from '@angular/core';
import { MatFormFieldModule } from '@angular/material/form-field';
import { MatSelectModule } from '@angular/material/select';
import { DROP_STATE_WORDS, DROP_STATES } from '@shared/contracts/drop-states';
import { SessionStore } from '../session/session-store';
import type { DropFilter } from './drop-filter';

/** State, product and owner of the drops on show. */
@Component({
  selector: 'app-drop-filter-row',
  imports: [MatFormFieldModule, MatSelectModule],
  changeDetection: ChangeDetectionStrategy.OnPush,
  host: { class: 'filter-row', role: 'search', 'aria-label': 'Filter of the drops' },
  template: `
    <mat-form-field>
      <mat-label>State</mat-label>
      <mat-select [value]="filter().state" (valueChange)="changed.emit({ ...filter(), state: $event })">
        <mat-option value="open">open</mat-option>
        @for (state of states; track state) {
          <mat-option [value]="state">{{ words[state] }}</mat-option>
        }
        @if (filter().state.includes(',')) {
          <mat-option [value]="filter().state">several states</mat-option>
        }
        <mat-option value="all">any state</mat-option>
      </mat-select>
    </mat-form-field>
    <mat-form-field>
      <mat-label>Product</mat-label>
      <mat-select
        [value]="filter().product ?? ''"
        (valueChange)="changed.emit({ ...filter(), product: $event || null })"
      >
        <mat-option value="">every product</mat-option>
        @for (product of products(); track product.key) {
          <mat-option [value]="product.key">{{ product.name }}</mat-option>
        }
      </mat-select>
    </mat-form-field>
    <mat-form-field>
      <mat-label>Owner</mat-label>
      <mat-select [value]="filter().owner ?? ''" (valueChange)="changed.emit({ ...filter(), owner: $event || null })">
        <mat-option value="">anybody or nobody</mat-option>
        <mat-option value="me">mine</mat-option>
        <mat-option value="nobody">nobody yet</mat-option>
        @for (person of people(); track person.personId) {
          @if (person.personId !== session.person()?.id) {
            <mat-option [value]="person.personId.toString()">{{ person.name }}</mat-option>
          }
        }
      </mat-select>
    </mat-form-field>
  `,
})
export class DropFilterRow {
  protected readonly session = inject(SessionStore);

  readonly filter = input.required<DropFilter>();
  readonly products = input.required<readonly { key: string; name: string }[]>();
  readonly people = input.required<readonly { personId: number; name: string }[]>();
  readonly changed = output<DropFilter>();

  protected readonly states = DROP_STATES;
  protected readonly words = DROP_STATE_WORDS;
}
