import { formatDecibels } from '@shared/units/format-decibels';
import { formatFrequency } from '@shared/units/format-frequency';
import type { Remark, RemarkCode } from './band-judgement';
import type { RunMargin } from './run-margin';
import type { Side } from './side';

/** 6 dB bandwidth of band B, Hz, where a sweep does not state its own. Source: CISPR 16-1-1. */
const BAND_B_RBW_HZ = 9_000;

/**
 * Largest loss of level of a line midway between two points of a grid.
 * Formula: 24.0824 (step / 2 / B6)^2, the attenuation of a Gaussian filter half a step off its centre.
 * @param stepHz distance of the points, Hz, above 0
 * @param bandwidthHz 6 dB bandwidth, Hz, above 0
 * @returns loss in dB
 * Source: Gaussian filter, 20 log10(2) * 4 = 24.0824 dB at one B6 off centre.
 * Example: 4.5 kHz steps at 9 kHz lose at most 1.51 dB.
 */
export function scallopingBoundDb(stepHz: number, bandwidthHz: number): number {
  return 24.0824 * (stepHz / 2 / bandwidthHz) ** 2;
}

function differs(
  build: Side,
  reference: Side,
  code: RemarkCode,
  what: string,
  write: (sweep: RunMargin) => string,
): Remark[] {
  const now = new Set(build.sweeps.map(write));
  const then = new Set(reference.sweeps.map(write));
  if ([...then].every((text) => now.has(text)) && [...now].every((text) => then.has(text))) return [];
  return [{ code, text: `${what}: ${[...now].join(', ')} now, ${[...then].join(', ')} in the reference` }];
}

function gridRemark(build: Side, reference: Side): Remark[] {
  const gridIds = new Set([...build.sweeps, ...reference.sweeps].map(({ gridId }) => gridId));
  if (gridIds.size < 2) return [];
  const bounds = [...build.sweeps, ...reference.sweeps].map(({ stepHz, rbwHz }) =>
    scallopingBoundDb(stepHz, rbwHz ?? BAND_B_RBW_HZ),
  );
  const text = `other frequency points: a line between two of them may read up to ${formatDecibels(Math.max(...bounds))} too low`;
  return [{ code: 'gridDiffers', text }];
}

/** What is not alike in the set-ups of the two sides. None of it changes the verdict. */
export function compareSetUps(build: Side, reference: Side): Remark[] {
  const remarks = [
    ...differs(build, reference, 'benchDiffers', 'bench', ({ bench }) => bench),
    ...differs(build, reference, 'unitDiffers', 'unit', ({ unit }) => unit ?? 'not stated'),
    ...differs(build, reference, 'attenuationDiffers', 'attenuation', ({ attenuationDb }) =>
      attenuationDb === null ? 'not stated' : formatDecibels(attenuationDb),
    ),
    ...differs(build, reference, 'stepDiffers', 'step', ({ stepHz }) => formatFrequency(stepHz)),
    ...gridRemark(build, reference),
  ];
  if ([...build.sweeps, ...reference.sweeps].some(({ rbwHz }) => rbwHz === null)) {
    remarks.push({ code: 'rbwNotStated', text: 'RBW not stated for some sweeps: taken to be 9 kHz' });
  }
  return remarks;
}
