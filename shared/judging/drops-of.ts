import type { BandJudgement } from './band-judgement';
import type { Drop } from './drop';

const leastMargin = (judgement: BandJudgement) => judgement.worst?.marginDb ?? Infinity;

function dropOf(lost: readonly BandJudgement[]): Drop {
  const byMargin = [...lost].sort((a, b) => leastMargin(a) - leastMargin(b));
  const lead = byMargin[0];
  return {
    stateId: lead.stateId,
    stateName: lead.stateName,
    band: lead.band,
    lead,
    witnesses: byMargin.flatMap(({ line, detector, differenceDb, worst }) =>
      differenceDb === null || worst === null
        ? []
        : [{ line, detector, differenceDb, worstMarginDb: worst.marginDb, frequencyHz: worst.frequencyHz }],
    ),
    overLimit: lost.some(({ overLimit }) => overLimit),
    leastMarginDb: leastMargin(lead),
    sizeDb: Math.max(...lost.map(({ differenceDb }) => -(differenceDb ?? 0))),
  };
}

/** Orders drops by what must be looked at first: over the limit, then least margin left, then size. */
export function compareDrops(a: Drop, b: Drop): number {
  return Number(b.overLimit) - Number(a.overLimit) || a.leastMarginDb - b.leastMarginDb || b.sizeDb - a.sizeDb;
}

/**
 * Gathers the lost bands of a build into drops, one per operating state and band.
 *
 * A switching harmonic shows in both lines and every detector: these are witnesses of one drop, not drops of their own.
 *
 * @param judgements of one build
 * @returns drops, most urgent first; witnesses by margin left, least first
 * Source: our own definition.
 * Example: the same band lost on L (QP), N (QP) and L (AV) gives one drop with three witnesses.
 */
export function dropsOf(judgements: readonly BandJudgement[]): Drop[] {
  const groups = new Map<string, BandJudgement[]>();
  for (const judgement of judgements) {
    if (judgement.verdict !== 'lost') continue;
    const key = JSON.stringify([judgement.stateId, judgement.band]);
    groups.set(key, [...(groups.get(key) ?? []), judgement]);
  }
  return [...groups.values()].map(dropOf).sort(compareDrops);
}
