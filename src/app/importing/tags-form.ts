import { FormArray, FormControl, FormGroup, ValidatorFn, Validators } from '@angular/forms';
import type { Detector, Line, SweepKind } from '@shared/detectors/detectors';

export interface StageControls {
  stage: FormControl<string>;
  frequencyKhz: FormControl<number | null>;
  spreadPercent: FormControl<number | null>;
}

export interface TagsControls {
  product: FormControl<string>;
  hardware: FormControl<string>;
  firmware: FormControl<string>;
  unit: FormControl<string>;
  state: FormControl<string>;
  bench: FormControl<string>;
  kind: FormControl<SweepKind>;
  /** Wall time in the team's zone, as a `datetime-local` field gives it. */
  takenAt: FormControl<string>;
  run: FormControl<string>;
  /** For traces whose file names none. */
  line: FormControl<Line | ''>;
  detector: FormControl<Detector | ''>;
  rbwKhz: FormControl<number | null>;
  attenuationDb: FormControl<number | null>;
  corrected: FormControl<boolean>;
  switching: FormArray<FormGroup<StageControls>>;
}

export type TagsForm = FormGroup<TagsControls>;
export type TagsFormContent = ReturnType<TagsForm['getRawValue']>;

const text = (...validators: ValidatorFn[]) => new FormControl('', { nonNullable: true, validators });

/** The tags that all files of an import share, as people type them. */
export function tagsForm(): TagsForm {
  return new FormGroup<TagsControls>({
    product: text(Validators.required),
    hardware: text(Validators.required, Validators.maxLength(120)),
    firmware: text(Validators.required, Validators.maxLength(120)),
    unit: text(Validators.maxLength(120)),
    state: text(Validators.maxLength(120)),
    bench: text(Validators.required),
    kind: new FormControl<SweepKind>('product', { nonNullable: true }),
    takenAt: text(),
    run: text(Validators.maxLength(120)),
    line: new FormControl<Line | ''>('', { nonNullable: true }),
    detector: new FormControl<Detector | ''>('', { nonNullable: true }),
    rbwKhz: new FormControl<number | null>(null, [Validators.min(0.001), Validators.max(1000)]),
    attenuationDb: new FormControl<number | null>(null, [Validators.min(-100), Validators.max(100)]),
    corrected: new FormControl(false, { nonNullable: true }),
    switching: new FormArray<FormGroup<StageControls>>([]),
  });
}

export interface StageContent {
  stage: string;
  frequencyHz: number;
  spreadPercent: number;
}

export function stageGroup(stage?: StageContent): FormGroup<StageControls> {
  return new FormGroup<StageControls>({
    stage: new FormControl(stage?.stage ?? '', {
      nonNullable: true,
      validators: [Validators.required, Validators.maxLength(40)],
    }),
    frequencyKhz: new FormControl(stage ? stage.frequencyHz / 1e3 : null, [
      Validators.required,
      Validators.min(0.1),
      Validators.max(30_000),
    ]),
    spreadPercent: new FormControl(stage?.spreadPercent ?? 0, [Validators.min(0), Validators.max(50)]),
  });
}
