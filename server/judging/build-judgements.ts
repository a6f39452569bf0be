import type { BandJudgement } from '@shared/judging/band-judgement';
import type { Context } from '../context';
import { listVerdicts } from './verdict-store';

/** The judgement of every band of every series of a build, as it was last judged. */
export function buildJudgements(context: Context, buildId: number): BandJudgement[] {
  return listVerdicts(context.db, buildId).map(({ judgement }) => judgement);
}
