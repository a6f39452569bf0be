import { nameHarmonic } from './match-harmonic';
import type { SwitchingStage } from './switching-stage';

/** Declared frequencies closer than this are one value written with unlike digits. Our own definition. */
const CHANGED_SHARE = 0.003;

/** The harmonic at the worst point, where it was and where it is. */
export interface HarmonicCause {
  readonly stage: string;
  readonly order: number;
  readonly fromHz: number;
  readonly toHz: number;
  /** False: the stage switches as before, and the harmonic only changed its level. */
  readonly moved: boolean;
}

/**
 * Names the harmonic that explains a worst point, when the declared switching frequencies allow one answer only.
 *
 * @param frequencyHz worst point of the build, Hz
 * @param build switching frequencies declared for the build
 * @param reference those declared for the reference
 * @param toleranceHz uncertainty of the worst point's frequency, Hz
 * @returns the harmonic, or null: no single harmonic fits, or the reference does not declare that stage
 * Throws RangeError on a tolerance of 0 or less.
 * Source: our own definition; a harmonic keeps its order when the switching frequency moves.
 * Example: 156 kHz, PFC 65 kHz before and 78 kHz now: order 2 moved from 130 to 156 kHz.
 */
export function findCause(
  frequencyHz: number,
  build: readonly SwitchingStage[],
  reference: readonly SwitchingStage[],
  toleranceHz: number,
): HarmonicCause | null {
  const match = nameHarmonic(frequencyHz, build, toleranceHz);
  if (!match) return null;
  const before = reference.filter(({ stage }) => stage === match.stage);
  if (before.length !== 1) return null;
  const fromHz = match.order * before[0].frequencyHz;
  const moved = Math.abs(match.expectedHz / fromHz - 1) > CHANGED_SHARE;
  return { stage: match.stage, order: match.order, fromHz, toHz: match.expectedHz, moved };
}
