import { ChangeDetectionStrategy, Component, computed, input, output } from '@angular/core';
import { MatButton } from '@angular/material/button';
import { MatIcon } from '@angular/material/icon';
import { ProgressLine } from '../ui/progress-line';
import type { DraftFile } from './draft-file';
import type { PlannedTrace } from './plan-import';
import { missingWords } from './tag-gaps';

/** What will be saved, what is still missing, and the button; always in view. */
@Component({
  selector: 'app-save-bar',
  imports: [MatButton, MatIcon, ProgressLine],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    @if (isSaving() || reading() > 0) {
      <app-progress-line [label]="isSaving() ? 'Saving' : 'Reading files'" [doneFraction]="readFraction()" />
    }
    <div class="refusal"><ng-content /></div>
    <div class="bar">
      <div class="words" role="status">
        <p class="count">{{ count() }}</p>
        @if (missing().length > 0) {
          <p class="missing"><mat-icon class="inline-icon" svgIcon="edit" />Still needed: {{ missing().join('; ') }}</p>
        }
        @if (unreadable() > 0) {
          <p class="small muted">
            {{
              unreadable() === 1 ? 'One file cannot be read and stays' : unreadable() + ' files cannot be read and stay'
            }}
            out.
          </p>
        }
      </div>
      <button
        mat-flat-button
        type="button"
        [disabled]="isSaving() || reading() > 0 || planned().length === 0"
        (click)="saved.emit()"
      >
        {{ action() }}
      </button>
    </div>
  `,
  styles: `
    :host {
      position: sticky;
      bottom: 0;
      z-index: 5;
      display: block;
      margin: 0 -1px;
      border: 1px solid var(--sl-hairline);
      border-radius: 8px;
      background: var(--sl-surface);
      box-shadow: 0 -4px 16px color-mix(in srgb, var(--sl-ink) 12%, transparent);
    }
    .refusal {
      max-height: 40vh;
      overflow-y: auto;
    }
    .bar {
      display: flex;
      flex-wrap: wrap;
      gap: 8px 16px;
      align-items: center;
      justify-content: space-between;
      padding: 10px 16px;
    }
    .words {
      flex: 1;
      min-width: 200px;
    }
    .count {
      font-weight: 500;
    }
    .missing {
      color: var(--sl-accent);
      font-size: 13px;
    }
    .missing mat-icon {
      margin-inline-end: 4px;
    }
  `,
})
export class SaveBar {
  readonly files = input.required<readonly DraftFile[]>();
  readonly planned = input.required<readonly PlannedTrace[]>();
  readonly isSaving = input.required<boolean>();
  readonly saved = output();

  protected readonly missing = computed(() => missingWords(this.planned()));
  protected readonly unreadable = computed(() => this.files().filter(({ problem }) => problem !== null).length);
  protected readonly reading = computed(
    () => this.files().filter(({ problem, reading }) => problem === null && reading === null).length,
  );
  protected readonly readFraction = computed(() =>
    this.isSaving() ? undefined : 1 - this.reading() / this.files().length,
  );

  protected readonly count = computed(() => {
    const planned = this.planned();
    const { length } = this.files();
    if (this.reading() > 0) return `Reading: ${length - this.reading()} of ${length} files`;
    if (planned.length === 0) return 'No trace to save';
    return `${counted(planned.length, 'sweep')} from ${counted(new Set(planned.map(({ fileId }) => fileId)).size, 'file')}`;
  });
  protected readonly action = computed(() => {
    if (this.isSaving()) return 'Saving…';
    const { length } = this.planned();
    return length === 0 ? 'Save' : `Save ${counted(length, 'sweep')}`;
  });
}

function counted(count: number, thing: string): string {
  return count === 1 ? `one ${thing}` : `${count} ${thing}s`;
}
