import type { LimitDetector, LimitLine } from './limit-line';
import type { LimitSet } from './limit-set';
import { CISPR32_A, CISPR32_B } from './tables/cispr-32';

/** Every limit set the product knows, in the order people choose from. */
export const LIMIT_SETS: readonly LimitSet[] = [CISPR32_B, CISPR32_A];

export function findLimitSet(key: string): LimitSet | undefined {
  return LIMIT_SETS.find((set) => set.key === key);
}

/**
 * The line of a set that a reading with the detector is held against.
 * A peak reading without a line of its own is held against the quasi-peak line: peak is never below quasi-peak, so it can
 * only overstate the emission.
 * Source for PK on the QP line: common practice, no source.
 */
export function lineForDetector(set: LimitSet, detector: LimitDetector): LimitLine | undefined {
  const own = set.lines.find((line) => line.detector === detector);
  if (own || detector !== 'PK') return own;
  return set.lines.find((line) => line.detector === 'QP');
}
