import { ChangeDetectionStrategy, Component, computed, inject, input, output } from '@angular/core';
import type { BatchTags } from '@shared/contracts/imports';
import { SWEEP_KINDS } from '@shared/detectors/detectors';
import { momentOf, wallTimeOf } from '@shared/time/zoned-time';
import { CurrentTeam } from '../session/current-team';
import { KIND_WORDS } from '../ui/kind-words';
import type { DraftFile, FileChoice } from './draft-file';
import { takenAtOf } from './taken-at-of';

/** What is different about one file: state, time, run and role, over the common tags. */
@Component({
  selector: 'app-file-choices',
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    @let choice = file().choice;
    <div>
      <label [attr.for]="fieldId('state')">State</label>
      <input
        [id]="fieldId('state')"
        #state
        type="text"
        [attr.list]="listId()"
        [value]="choice.state ?? ''"
        [placeholder]="common().state ?? 'needed'"
        [class.needed]="!choice.state && !common().state"
        (change)="chosen.emit({ state: words(state.value) })"
      />
      <datalist [id]="listId()">
        @for (one of states(); track one) {
          <option [value]="one"></option>
        }
      </datalist>
    </div>
    <div>
      <label [attr.for]="fieldId('taken-at')">Taken at</label>
      <input
        [id]="fieldId('taken-at')"
        #takenAt
        type="datetime-local"
        [value]="wallTime()"
        [attr.aria-describedby]="takenAtNote() ? fieldId('taken-at-note') : null"
        (change)="chooseTakenAt(takenAt)"
      />
      @if (takenAtNote(); as note) {
        <span class="note" [id]="fieldId('taken-at-note')">{{ note }}</span>
      }
    </div>
    <div>
      <label [attr.for]="fieldId('run')">Run</label>
      <input
        [id]="fieldId('run')"
        #run
        type="text"
        [value]="choice.run ?? ''"
        [placeholder]="common().run ?? 'day and bench'"
        (change)="chosen.emit({ run: words(run.value) })"
      />
    </div>
    <div>
      <label [attr.for]="fieldId('role')">Role</label>
      <select [id]="fieldId('role')" #kind (change)="chooseKind(kind.value)">
        <option value="" [selected]="!choice.kind">as all: {{ kindWords[common().kind ?? 'product'] }}</option>
        @for (one of kinds; track one) {
          <option [value]="one" [selected]="one === choice.kind">{{ kindWords[one] }}</option>
        }
      </select>
    </div>
  `,
  styleUrl: './file-choices.scss',
})
export class FileChoices {
  private readonly team = inject(CurrentTeam);

  readonly file = input.required<DraftFile>();
  readonly common = input.required<BatchTags>();
  readonly states = input.required<readonly string[]>();
  readonly chosen = output<Partial<FileChoice>>();

  protected readonly kinds = SWEEP_KINDS;
  protected readonly kindWords = KIND_WORDS;
  protected readonly listId = computed(() => this.fieldId('states'));
  private readonly time = computed(() => takenAtOf(this.file(), this.common()));
  protected readonly wallTime = computed(() => this.wallTimeAt(this.time().takenAt));
  protected readonly takenAtNote = computed(() => {
    const stated = this.file().reading?.takenAt ?? null;
    if (stated === null) return '';
    return this.time().isFromFile ? 'from the file' : `the file says ${this.wallTimeAt(stated).replace('T', ' ')}`;
  });

  protected fieldId(name: string): string {
    return `${name}-of-file-${this.file().id}`;
  }

  protected words(text: string): string | undefined {
    return text.trim() || undefined;
  }

  /** Emptied, the field goes back to what holds without a choice. */
  protected chooseTakenAt(field: HTMLInputElement): void {
    const takenAt = momentOf(field.value, this.team.timeZone());
    const { choice, ...file } = this.file();
    if (takenAt === undefined) {
      field.value = this.wallTimeAt(takenAtOf({ ...file, choice: { ...choice, takenAt } }, this.common()).takenAt);
    }
    this.chosen.emit({ takenAt });
  }

  private wallTimeAt(at: string | undefined): string {
    return at === undefined ? '' : wallTimeOf(at, this.team.timeZone());
  }

  protected chooseKind(text: string): void {
    this.chosen.emit({ kind: SWEEP_KINDS.find((kind) => kind === text) });
  }
}
