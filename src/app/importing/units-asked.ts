import { ChangeDetectionStrategy, Component, input, output } from '@angular/core';
import type { Problem } from '@shared/contracts/problem';
import { FREQUENCY_UNITS, FrequencyUnit } from '@shared/units/frequency-unit';
import { LEVEL_UNITS, LevelUnit } from '@shared/units/level-unit';
import type { Units } from './draft-file';

/** The units that a file leaves out; choosing one reads the file again. */
@Component({
  selector: 'app-units-asked',
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <div class="field">
      <label for="frequency-unit-of-{{ fileId() }}">Frequencies in</label>
      <select
        id="frequency-unit-of-{{ fileId() }}"
        [class.needed]="needs() === 'frequencyUnit'"
        (change)="chooseFrequency(frequency.value)"
        #frequency
      >
        <option value="" [selected]="!units().frequencyUnit">as in the file</option>
        @for (unit of frequencyUnits; track unit) {
          <option [value]="unit" [selected]="unit === units().frequencyUnit">{{ unit }}</option>
        }
      </select>
    </div>
    <div class="field">
      <label for="level-unit-of-{{ fileId() }}">Levels in</label>
      <select
        id="level-unit-of-{{ fileId() }}"
        [class.needed]="needs() === 'levelUnit'"
        (change)="chooseLevel(level.value)"
        #level
      >
        <option value="" [selected]="!units().levelUnit">as in the file</option>
        @for (unit of levelUnits; track unit.key) {
          <option [value]="unit.key" [selected]="unit.key === units().levelUnit">{{ unit.words }}</option>
        }
      </select>
    </div>
  `,
  styleUrl: './units-asked.scss',
})
export class UnitsAsked {
  readonly fileId = input.required<number>();
  readonly units = input.required<Units>();
  /** The unit without which the file cannot be read. */
  readonly needs = input<Problem['needs']>();
  readonly chosen = output<Units>();

  protected readonly frequencyUnits = FREQUENCY_UNITS;
  protected readonly levelUnits = LEVEL_UNITS.map((key) => ({ key, words: key.replace('u', 'µ') }));

  protected chooseFrequency(unit: string): void {
    const { levelUnit } = this.units();
    const frequencyUnit = FREQUENCY_UNITS.find((one): one is FrequencyUnit => one === unit);
    this.chosen.emit({ ...(frequencyUnit && { frequencyUnit }), ...(levelUnit && { levelUnit }) });
  }

  protected chooseLevel(unit: string): void {
    const { frequencyUnit } = this.units();
    const levelUnit = LEVEL_UNITS.find((one): one is LevelUnit => one === unit);
    this.chosen.emit({ ...(frequencyUnit && { frequencyUnit }), ...(levelUnit && { levelUnit }) });
  }
}
