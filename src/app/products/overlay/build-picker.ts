import { ChangeDetectionStrategy, Component, computed, input, output, signal } from '@angular/core';
import { MatAutocompleteModule, MatAutocompleteSelectedEvent } from '@angular/material/autocomplete';
import { MatChipsModule } from '@angular/material/chips';
import { MatFormFieldModule } from '@angular/material/form-field';
import { MatIcon } from '@angular/material/icon';
import type { BuildSummary } from '@shared/contracts/builds';
import { MarginValue } from '../../ui/margin-value';
import { TimeStamp } from '../../ui/time-stamp';

const MOST_OPTIONS = 40;

/** Chooses builds from any number: the chosen ones as chips, the others by typing a part of a revision. */
@Component({
  selector: 'app-build-picker',
  imports: [MarginValue, MatAutocompleteModule, MatChipsModule, MatFormFieldModule, MatIcon, TimeStamp],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <mat-form-field>
      <mat-label>Builds</mat-label>
      <div class="row">
        <mat-chip-grid #grid aria-label="Builds in the picture">
          @for (build of chosen(); track build.id) {
            <mat-chip-row (removed)="remove(build)">
              @if (build.isReference) {
                <mat-icon matChipAvatar svgIcon="reference" aria-label="reference" />
              }
              {{ build.hardware }} / {{ build.firmware }}
              <button matChipRemove type="button" [attr.aria-label]="'Take ' + build.firmware + ' out'">
                <mat-icon svgIcon="close" />
              </button>
            </mat-chip-row>
          }
        </mat-chip-grid>
        <input
          #field
          placeholder="Add a build"
          [matChipInputFor]="grid"
          [matAutocomplete]="list"
          (input)="typed.set(field.value)"
        />
      </div>
      <mat-autocomplete #list (optionSelected)="add($event, field)">
        @for (build of options(); track build.id) {
          <mat-option [value]="build.id">
            <span class="option">
              <span>{{ build.hardware }} / {{ build.firmware }}{{ build.isReference ? ', reference' : '' }}</span>
              <span class="muted small"><app-time [at]="build.builtAt" detail="day" /></span>
              <app-margin-value class="small" [marginDb]="build.worstMarginDb" />
            </span>
          </mat-option>
        } @empty {
          <mat-option disabled>No other build with this in its revisions</mat-option>
        }
      </mat-autocomplete>
    </mat-form-field>
  `,
  styles: `
    :host {
      display: block;
      min-width: 0;
    }
    .row {
      display: flex;
      flex-wrap: wrap;
      gap: 4px 8px;
      align-items: center;
    }
    .row mat-chip-grid {
      flex: 0 1 auto;
    }
    .row input {
      flex: 1 1 120px;
      margin: 0;
    }
    .option {
      display: grid;
      grid-template-columns: minmax(140px, auto) 96px 92px;
      gap: 12px;
      align-items: baseline;
      font-size: 13px;
    }
    .option > :last-child {
      text-align: end;
    }
  `,
})
export class BuildPicker {
  /** Oldest first. */
  readonly builds = input.required<readonly BuildSummary[]>();
  readonly chosen = input.required<readonly BuildSummary[]>();
  /** The ids that are chosen after a change. */
  readonly changed = output<number[]>();

  protected readonly typed = signal('');
  protected readonly options = computed(() => {
    const taken = new Set(this.chosen().map(({ id }) => id));
    const parts = this.typed()
      .toLowerCase()
      .split(/[\s/]+/);
    return this.builds()
      .filter(({ id, hardware, firmware }) => {
        const text = `${hardware} ${firmware}`.toLowerCase();
        return !taken.has(id) && parts.every((part) => text.includes(part));
      })
      .reverse()
      .slice(0, MOST_OPTIONS);
  });

  protected add({ option }: MatAutocompleteSelectedEvent, field: HTMLInputElement): void {
    field.value = '';
    this.typed.set('');
    this.changed.emit([...this.ids(), option.value as number]);
  }

  protected remove(build: BuildSummary): void {
    this.changed.emit(this.ids().filter((id) => id !== build.id));
  }

  private ids(): number[] {
    return this.chosen().map(({ id }) => id);
  }
}
