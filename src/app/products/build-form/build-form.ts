import { inject } from '@angular/core';
import { NonNullableFormBuilder, Validators } from '@angular/forms';
import type { BuildInput, BuildView } from '@shared/contracts/builds';
import { momentOf, wallTimeOf } from '@shared/time/zoned-time';

const name = [Validators.required, Validators.maxLength(120)];
const notes = Validators.maxLength(4000);

/** The form of a build, filled from one that exists or empty for a new one; called in an injection context. */
export function buildForm(build: BuildView | undefined, now: number, timeZone: string) {
  const builder = inject(NonNullableFormBuilder);
  const stage = (value = { stage: '', frequencyHz: 0, spreadPercent: 0 }) =>
    builder.group({
      stage: [value.stage, [Validators.required, Validators.maxLength(40)]],
      // People say kHz; the address of an error of the server stays that of the field.
      frequencyHz: [
        value.frequencyHz / 1e3 || (null as number | null),
        [Validators.required, Validators.min(0.1), Validators.max(30e3)],
      ],
      spreadPercent: [value.spreadPercent, [Validators.required, Validators.min(0), Validators.max(50)]],
    });
  const parameter = (value = { name: '', value: '' }) =>
    builder.group({ name: [value.name, name], value: [value.value, Validators.maxLength(400)] });
  const form = builder.group({
    hardware: [build?.hardware ?? '', name],
    firmware: [build?.firmware ?? '', name],
    commit: [build?.commit ?? '', Validators.maxLength(80)],
    builtAt: [wallTimeOf(build?.builtAt ?? now, timeZone), Validators.required],
    hardwareNotes: [build?.hardwareNotes ?? '', notes],
    firmwareNotes: [build?.firmwareNotes ?? '', notes],
    notes: [build?.notes ?? '', notes],
    switching: builder.array((build?.switching ?? []).map((value) => stage(value))),
    parameters: builder.array((build?.parameters ?? []).map((value) => parameter(value))),
  });
  return {
    form,
    addStage: () => form.controls.switching.push(stage()),
    addParameter: () => form.controls.parameters.push(parameter()),
  };
}

/** What the server takes; the form must be valid. */
export function buildInput(form: ReturnType<typeof buildForm>['form'], timeZone: string): BuildInput {
  const { builtAt, switching, ...rest } = form.getRawValue();
  return {
    ...rest,
    builtAt: momentOf(builtAt, timeZone) ?? '',
    switching: switching.map(({ frequencyHz, ...stage }) => ({ ...stage, frequencyHz: hertz(frequencyHz ?? 0) })),
  };
}

/** kHz as typed in Hz, to the mHz, so that 65.1 kHz is 65100 Hz and no fraction less. */
function hertz(frequencyKhz: number): number {
  return Math.round(frequencyKhz * 1e6) / 1e3;
}
