import { ChangeDetectionStrategy, Component, computed, input, signal } from '@angular/core';
import { FormControl, ReactiveFormsModule } from '@angular/forms';
import { MatAutocompleteModule } from '@angular/material/autocomplete';
import { MatFormFieldModule } from '@angular/material/form-field';
import { MatInput } from '@angular/material/input';
import { FieldErrorPipe } from '../ui/field-error';

/** A text field that proposes what is known already and takes anything new. */
@Component({
  selector: 'app-suggest-field',
  imports: [FieldErrorPipe, MatAutocompleteModule, MatFormFieldModule, MatInput, ReactiveFormsModule],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <mat-form-field>
      <mat-label>{{ label() }}</mat-label>
      <input
        matInput
        #field
        autocomplete="off"
        [formControl]="control()"
        [matAutocomplete]="known"
        (focus)="typed.set('')"
        (input)="typed.set(field.value)"
      />
      <mat-autocomplete #known="matAutocomplete">
        @for (option of shown(); track option) {
          <mat-option [value]="option">{{ option }}</mat-option>
        }
      </mat-autocomplete>
      @if (hint()) {
        <mat-hint [class.needed]="hint().startsWith('Needed')">{{ hint() }}</mat-hint>
      }
      <mat-error>{{ control() | fieldError }}</mat-error>
    </mat-form-field>
  `,
  styles: `
    .needed {
      color: var(--sl-accent);
      font-weight: 500;
    }
  `,
})
export class SuggestField {
  readonly label = input.required<string>();
  readonly control = input.required<FormControl<string>>();
  readonly options = input<readonly string[]>([]);
  readonly hint = input('');

  protected readonly typed = signal('');
  protected readonly shown = computed(() => {
    const typed = this.typed().trim().toLowerCase();
    return this.options().filter((option) => option.toLowerCase().includes(typed));
  });
}
