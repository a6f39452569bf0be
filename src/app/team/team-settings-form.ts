import { inject } from '@angular/core';
import { AbstractControl, NonNullableFormBuilder, ValidationErrors, Validators } from '@angular/forms';
import type { TeamPatch, TeamView } from '@shared/contracts/teams';

/** Ends of a team's own band as people write them, MHz. */
const LEAST_MHZ = 0.15;
const MOST_MHZ = 30;

function endsAboveStart(band: AbstractControl): ValidationErrors | null {
  const { fromMhz, toMhz } = band.value as { fromMhz: number | null; toMhz: number | null };
  return fromMhz !== null && toMhz !== null && fromMhz >= toMhz ? { order: 'a band must end above its start' } : null;
}

/** The form of a team's settings, empty; called in an injection context. */
export function teamSettingsForm() {
  const builder = inject(NonNullableFormBuilder);
  const inRange = [Validators.required, Validators.min(LEAST_MHZ), Validators.max(MOST_MHZ)];
  const band = (name: string, fromMhz: number | null, toMhz: number | null) =>
    builder.group(
      {
        name: [name, [Validators.required, Validators.maxLength(120)]],
        fromMhz: builder.control(fromMhz, inRange),
        toMhz: builder.control(toMhz, inRange),
      },
      { validators: endsAboveStart },
    );
  const form = builder.group({
    name: ['', [Validators.required, Validators.maxLength(120)]],
    timeZone: ['', Validators.required],
    targetMarginDb: builder.control<number | null>(null, [Validators.required, Validators.min(0), Validators.max(40)]),
    thresholdDb: builder.control<number | null>(null, [Validators.required, Validators.min(0.5), Validators.max(20)]),
    bands: builder.array<ReturnType<typeof band>>([]),
  });
  return { form, band };
}

export type TeamSettingsForm = ReturnType<typeof teamSettingsForm>;

export function fillTeamSettings({ form, band }: TeamSettingsForm, team: TeamView): void {
  const { name, timeZone, targetMarginDb, thresholdDb } = team;
  form.patchValue({ name, timeZone, targetMarginDb, thresholdDb });
  form.controls.bands.clear();
  for (const own of team.bands) form.controls.bands.push(band(own.name, own.fromHz / 1e6, own.toHz / 1e6));
  form.markAsPristine();
}

/** What the form changes of the team; nothing for values that stayed, so that the audit log names the others only. */
export function teamPatch({ form }: TeamSettingsForm, team: TeamView): TeamPatch {
  const { name, timeZone, targetMarginDb, thresholdDb, bands } = form.getRawValue();
  const wanted: Required<TeamPatch> = {
    name: name.trim(),
    timeZone: timeZone.trim(),
    targetMarginDb: targetMarginDb ?? team.targetMarginDb,
    thresholdDb: thresholdDb ?? team.thresholdDb,
    // Six decimals of a MHz are whole Hz; multiplying alone would leave 0.15 MHz just beside 150 kHz.
    bands: bands.map((own) => ({
      name: own.name.trim(),
      fromHz: Math.round((own.fromMhz ?? 0) * 1e6),
      toHz: Math.round((own.toMhz ?? 0) * 1e6),
    })),
  };
  const changed = Object.entries(wanted).filter(
    ([key, value]) => JSON.stringify(value) !== JSON.stringify(team[key as keyof TeamPatch]),
  );
  return Object.fromEntries(changed);
}
