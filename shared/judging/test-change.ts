import { studentTCdf, studentTQuantile } from '@shared/statistics/student-t';
import type { JudgedSpread } from './band-judgement';

/** One-sided 5 %: the 90 % interval is what "held" is decided with. */
const INTERVAL_QUANTILE = 0.95;

export interface ChangeTest {
  readonly differenceDb: number;
  readonly halfWidthDb: number;
  /** One-sided p of a loss and of a gain; their sum is 1. */
  readonly lossP: number;
  readonly gainP: number;
}

/**
 * Half width of the 90 % interval of a difference of two means.
 * Formula: h = t(0.95, v) s sqrt(1 / n_b + 1 / n_ref).
 * @param spread s_I in dB with its degrees of freedom v
 * @param buildRuns n_b, 1 or more
 * @param referenceRuns n_ref, 1 or more
 * @returns h in dB
 * Source: two-sample comparison with known degrees of freedom, ISO 5725-6:1994, 4.2 (critical difference of two means).
 * Example: s = 0.7 dB with 4 degrees of freedom, one run against one: 2.11 dB.
 */
export function halfWidthDb(
  spread: Pick<JudgedSpread, 'sdDb' | 'degreesOfFreedom'>,
  buildRuns: number,
  referenceRuns: number,
): number {
  const t = studentTQuantile(INTERVAL_QUANTILE, spread.degreesOfFreedom);
  return t * spread.sdDb * Math.sqrt(1 / buildRuns + 1 / referenceRuns);
}

/** Chance of a loss as large as `differenceDb` or larger where nothing changed: Student t of d / (s sqrt(1/n_b + 1/n_ref)). */
export function lossP(
  differenceDb: number,
  spread: Pick<JudgedSpread, 'sdDb' | 'degreesOfFreedom'>,
  buildRuns: number,
  referenceRuns: number,
): number {
  const standardError = spread.sdDb * Math.sqrt(1 / buildRuns + 1 / referenceRuns);
  return studentTCdf(differenceDb / standardError, spread.degreesOfFreedom);
}

/** Tests the difference of two means for a loss and for a gain. */
export function testChange(
  differenceDb: number,
  spread: Pick<JudgedSpread, 'sdDb' | 'degreesOfFreedom'>,
  buildRuns: number,
  referenceRuns: number,
): ChangeTest {
  return {
    differenceDb,
    halfWidthDb: halfWidthDb(spread, buildRuns, referenceRuns),
    lossP: lossP(differenceDb, spread, buildRuns, referenceRuns),
    gainP: lossP(-differenceDb, spread, buildRuns, referenceRuns),
  };
}
