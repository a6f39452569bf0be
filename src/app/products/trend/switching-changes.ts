import type { TrendView } from '@shared/contracts/margins';

/** A stage's switching frequency that a build declared otherwise than the last build that declared one. */
export interface SwitchingChange {
  buildId: number;
  hardware: string;
  firmware: string;
  builtAt: string;
  stage: string;
  /** Null for the first build that declares the stage. */
  fromHz: number | null;
  toHz: number;
}

/** Where along the builds the switching frequencies changed, newest first. Builds that declare nothing change nothing. */
export function switchingChanges(points: TrendView['points']): SwitchingChange[] {
  const known = new Map<string, number>();
  const changes: SwitchingChange[] = [];
  for (const { buildId, hardware, firmware, builtAt, switching } of points) {
    for (const { stage, frequencyHz } of switching) {
      const fromHz = known.get(stage) ?? null;
      if (fromHz === frequencyHz) continue;
      known.set(stage, frequencyHz);
      changes.push({ buildId, hardware, firmware, builtAt, stage, fromHz, toHz: frequencyHz });
    }
  }
  return changes.reverse();
}
