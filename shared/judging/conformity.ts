import { normalCdf } from '@shared/statistics/normal';
import type { LabUncertainty } from './build-input';

/**
 * Chance that a product meets the limit, given the margin measured.
 * Formula: Phi(margin / u), u = U / 2.
 * @param marginDb margin in dB
 * @param expandedDb expanded uncertainty U of the laboratory (k = 2), dB, above 0
 * @returns probability, 0 to 1
 * Throws RangeError on an uncertainty of 0 or less.
 * Source: JCGM 106:2012, clause 7 (single tolerance limit, normal distribution).
 * Example: 2.8 dB at U = 3.4 dB give 0.950.
 */
export function conformityProbability(marginDb: number, expandedDb: number): number {
  if (!(expandedDb > 0)) throw new RangeError(`an uncertainty must be above 0 dB, not ${expandedDb} dB`);
  return normalCdf(marginDb / (expandedDb / 2));
}

/**
 * What a margin loses before it is compared with the limit, since the laboratory is less certain than the standard assumes.
 * Formula: max(0, U_lab - U_cispr).
 * @returns dB, 0 or more
 * Source: CISPR 16-4-2:2011, clause 4 (comparison with a limit when U_lab is larger than U_cispr).
 * Example: U_lab 4.0 dB and U_cispr 3.4 dB take off 0.6 dB.
 */
export function uncertaintyAllowanceDb({ labDb, cisprDb }: LabUncertainty): number {
  return Math.max(0, labDb - cisprDb);
}
