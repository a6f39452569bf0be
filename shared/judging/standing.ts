import type { BandJudgement } from './band-judgement';
import type { BuildInput } from './build-input';
import { conformityProbability, uncertaintyAllowanceDb } from './conformity';

type Standing = Pick<BandJudgement, 'overLimit' | 'underTarget' | 'pConform'>;

/**
 * Where the worst margin of a build stands to the limit and the target, whatever the verdict on its change.
 * @param worstMarginDb dB, or null when not measured
 * @param input target margin in dB and the laboratory's budget; U_lab above U_cispr is taken off the margin before the limit
 *   is compared
 * Source: CISPR 16-4-2 for the allowance, JCGM 106 for the chance.
 * Example: -0.1 dB is over the limit; 0 dB is not.
 */
export function standing(
  worstMarginDb: number | null,
  { targetMarginDb, uncertainty }: Pick<BuildInput, 'targetMarginDb' | 'uncertainty'>,
): Standing {
  if (worstMarginDb === null) return { overLimit: false, underTarget: false, pConform: null };
  const allowanceDb = uncertainty ? uncertaintyAllowanceDb(uncertainty) : 0;
  return {
    overLimit: worstMarginDb - allowanceDb < 0,
    underTarget: worstMarginDb - allowanceDb < targetMarginDb,
    pConform: uncertainty ? conformityProbability(worstMarginDb, uncertainty.labDb) : null,
  };
}
