import { ChangeDetectionStrategy, Component, computed, input } from '@angular/core';
import { MatIcon } from '@angular/material/icon';
import type { Problem } from '@shared/contracts/problem';
import { asSentence } from './as-sentence';
import { adviceOn } from './problem';

/** Says what happened, what was kept and what to do. Buttons to act go inside the tag. */
@Component({
  selector: 'app-problem-banner',
  imports: [MatIcon],
  changeDetection: ChangeDetectionStrategy.OnPush,
  host: { role: 'alert' },
  template: `
    <mat-icon svgIcon="error" />
    <div class="text">
      <p class="happened">{{ happened() }}</p>
      @if (place(); as place) {
        <p class="number">{{ place }}</p>
      }
      @for (error of loose(); track error.path) {
        <p>{{ error.path }}: {{ error.message }}</p>
      }
      @if (kept()) {
        <p>{{ kept() }}</p>
      }
      @if (advice()) {
        <p>{{ advice() }}</p>
      }
      <div class="actions"><ng-content /></div>
    </div>
  `,
  styles: `
    :host {
      display: flex;
      gap: 12px;
      padding: 12px 16px;
      border-inline-start: 4px solid var(--sl-lost);
      border-radius: 6px;
      background: var(--sl-lost-ground);
      font-size: 13px;
    }
    mat-icon {
      flex: none;
      color: var(--sl-lost);
    }
    .text {
      display: grid;
      gap: 2px;
      min-width: 0;
      overflow-wrap: anywhere;
    }
    .happened {
      font-size: 14px;
      font-weight: 500;
    }
    .actions:empty {
      display: none;
    }
    .actions {
      margin-top: 4px;
    }
  `,
})
export class ProblemBanner {
  readonly problem = input.required<Problem>();
  /** What survived the failure, in one sentence: "What you typed is still here." */
  readonly kept = input('');
  /** Form fields that show their own errors, so that the banner need not repeat them. */
  readonly shownPaths = input<readonly string[]>([]);

  protected readonly advice = computed(() => adviceOn(this.problem()));
  protected readonly happened = computed(() => {
    const { errors, detail } = this.problem();
    return errors?.length ? 'Some fields need another look.' : asSentence(detail);
  });
  /** Errors that no field shows. */
  protected readonly loose = computed(() =>
    (this.problem().errors ?? []).filter((error) => !this.shownPaths().includes(error.path)),
  );
  protected readonly place = computed(() => {
    const { line, column, found, expected } = this.problem();
    const where = line === undefined ? '' : `Line ${line}${column === undefined ? '' : `, column ${column}`}`;
    const what = found === undefined ? '' : `found "${found}"${expected === undefined ? '' : `, expected ${expected}`}`;
    return [where, what].filter(Boolean).join(': ');
  });
}
