import { HttpClient } from '@angular/common/http';
import { ChangeDetectionStrategy, Component, computed, inject, input, signal } from '@angular/core';
import { ReactiveFormsModule } from '@angular/forms';
import { MatButton } from '@angular/material/button';
import { MatFormFieldModule } from '@angular/material/form-field';
import { MatIcon } from '@angular/material/icon';
import { MatInput } from '@angular/material/input';
import { MatSelectModule } from '@angular/material/select';
import type { BuildSummary, BuildView } from '@shared/contracts/builds';
import { DETECTORS, LINES } from '@shared/detectors/detectors';
import { formatFrequency } from '@shared/units/format-frequency';
import { CurrentTeam } from '../session/current-team';
import { FieldErrorPipe } from '../ui/field-error';
import type { DraftFile } from './draft-file';
import { ImportApi } from './import-api';
import { StagesEditor } from './stages-editor';
import { noteOnSetting } from './note-on-setting';
import { SuggestField } from './suggest-field';
import { TagCatalogue } from './tag-catalogue';
import { stageGroup, TagsForm, TagsFormContent } from './tags-form';
import { fillFromLast } from './tags-of-form';

/** The tags that are filled in once for all files. */
@Component({
  selector: 'app-tags-panel',
  imports: [
    FieldErrorPipe,
    MatButton,
    MatFormFieldModule,
    MatIcon,
    MatInput,
    MatSelectModule,
    ReactiveFormsModule,
    StagesEditor,
    SuggestField,
  ],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './tags-panel.html',
  styleUrl: './tags-panel.scss',
})
export class TagsPanel {
  private readonly api = inject(ImportApi);
  private readonly http = inject(HttpClient);
  protected readonly catalogue = inject(TagCatalogue);
  protected readonly team = inject(CurrentTeam);

  readonly form = input.required<TagsForm>();
  /** What the form holds now. */
  readonly content = input.required<TagsFormContent>();
  readonly teamKey = input.required<string>();
  readonly files = input.required<readonly DraftFile[]>();

  protected readonly lines = LINES;
  protected readonly detectors = DETECTORS;
  protected readonly isFilling = signal(false);
  protected readonly note = signal('');

  private readonly build = computed(() => {
    const { hardware, firmware } = this.content();
    return this.catalogue
      .knownBuilds()
      .find((build) => build.hardware === hardware.trim() && build.firmware === firmware.trim());
  });

  protected readonly buildNote = computed(() => {
    const { product, hardware, firmware } = this.content();
    if (!this.catalogue.chosen() || !product || !hardware.trim() || !firmware.trim()) return null;
    const name = `${hardware.trim()} / ${firmware.trim()}`;
    const build = this.build();
    if (!build) return { isNew: true, text: `${name} is a new build; saving makes it.` };
    return { isNew: false, text: `${name} is known, with ${counted(build.sweepCount, 'sweep')}.` };
  });

  protected readonly stateNote = computed(() => {
    const state = this.content().state.trim();
    const known = this.catalogue.states();
    if (state === '') return 'Needed, here or for each file';
    return known.length === 0 || known.includes(state) ? '' : 'A new state; saving makes it.';
  });

  protected readonly rbwNote = computed(() => {
    const { rbwKhz } = this.content();
    const stated = distinct(this.files().map(({ reading }) => reading?.rbwHz ?? null));
    return noteOnSetting(rbwKhz === null ? null : rbwKhz * 1e3, stated, formatFrequency);
  });

  protected readonly attenuationNote = computed(() => {
    const stated = distinct(this.files().map(({ reading }) => reading?.attenuationDb ?? null));
    return noteOnSetting(this.content().attenuationDb, stated, (attenuationDb) => `${attenuationDb} dB`);
  });

  /** The build whose stages may be taken over: the one being measured, or else the one before. */
  protected readonly stageSource = computed(() => this.build() ?? this.catalogue.knownBuilds().at(0) ?? null);

  protected needs(name: 'product' | 'hardware' | 'firmware' | 'bench'): string {
    return this.content()[name].trim() === '' ? 'Needed' : '';
  }

  protected fillAsLast(): void {
    this.isFilling.set(true);
    this.api.lastTags(this.teamKey()).subscribe({
      next: (last) => {
        this.isFilling.set(false);
        if (!last) {
          this.note.set('You have imported nothing in this team yet.');
          return;
        }
        fillFromLast(this.form(), last);
        this.note.set(`As your last sweep: ${last.hardware} / ${last.firmware}, ${last.state}. Check what changed.`);
      },
      error: () => {
        this.isFilling.set(false);
        this.note.set('The tags of your last sweep could not be fetched. What you typed is still here.');
      },
    });
  }

  protected copyStages({ id }: BuildSummary): void {
    const { product } = this.content();
    const path = `/api/v1/products/${encodeURIComponent(product)}/builds/${id}`;
    this.http
      .get<BuildView>(path, { params: { team: this.teamKey() } })
      .subscribe(({ switching, hardware, firmware }) => {
        const stages = this.form().controls.switching;
        stages.clear();
        for (const stage of switching) stages.push(stageGroup(stage));
        if (switching.length === 0) this.note.set(`No switching frequencies are known of ${hardware} / ${firmware}.`);
      });
  }
}

function counted(count: number, thing: string): string {
  return count === 1 ? `one ${thing}` : `${count} ${thing}s`;
}

function distinct(numbers: readonly (number | null)[]): number[] {
  return [...new Set(numbers.filter((number) => number !== null))];
}
