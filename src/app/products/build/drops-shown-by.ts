import type { DropSummary } from '@shared/contracts/drops';

/**
 * The drops whose loss a build shows, its own and those of earlier builds that it carries on, each with the numbers of this
 * build: over the limit first, then the least margin. Withdrawn ones are left out, the data do not support them.
 */
export function dropsShownBy(drops: readonly DropSummary[], buildId: number): DropSummary[] {
  return drops
    .filter(({ state }) => state !== 'withdrawn')
    .flatMap((drop) => {
      const here = drop.seenIn.find((sighting) => sighting.buildId === buildId);
      if (here === undefined) return [];
      const { differenceDb, marginDb, frequencyHz, isOverLimit } = here;
      const since = drop.buildId === buildId ? '' : `Still there since ${drop.hardware} / ${drop.firmware}. `;
      return [{ ...drop, differenceDb, marginDb, frequencyHz, isOverLimit, sentence: `${since}${drop.sentence}` }];
    })
    .sort((a, b) => Number(b.isOverLimit) - Number(a.isOverLimit) || a.marginDb - b.marginDb);
}
