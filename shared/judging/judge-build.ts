import { adjustByBenjaminiHochberg } from '@shared/statistics/benjamini-hochberg';
import type { BandJudgement, JudgedSpread } from './band-judgement';
import type { BandInput, BuildInput, SeriesInput } from './build-input';
import { comparableSides, type Comparison } from './comparable-sides';
import { estimateSpreads } from './estimate-spreads';
import { judgeBand, refuseBand } from './judge-band';
import { testChange, type ChangeTest } from './test-change';

interface Examined {
  readonly series: SeriesInput;
  readonly band: BandInput;
  readonly comparison: Comparison;
  readonly spread: JudgedSpread;
  /** Null where the comparison was refused. */
  readonly test: ChangeTest | null;
}

function examine(input: BuildInput): Examined[] {
  const bands = input.series.flatMap((series) =>
    series.bands.map((band) => ({ series, band, limitLineKey: series.limitLineKey })),
  );
  const spreads = estimateSpreads(bands);
  return bands.map(({ series, band, limitLineKey }, index) => {
    const comparison = comparableSides(band, limitLineKey);
    const spread = spreads[index];
    if ('refused' in comparison) return { series, band, comparison, spread, test: null };
    const { build, reference } = comparison;
    const differenceDb = build.meanMarginDb - reference.meanMarginDb;
    return {
      series,
      band,
      comparison,
      spread,
      test: testChange(differenceDb, spread, build.runCount, reference.runCount),
    };
  });
}

/**
 * Judges one build: every band of every series against its reference.
 *
 * Per band: the mean margin of the build's runs less that of the reference's, its 90 % interval and its one-sided p, adjusted
 * over all bands and states of the build that could be compared. See `decideVerdict` for the rule.
 *
 * @param input all series of the build; margins in dB, frequencies in Hz, threshold above 0 dB
 * @returns one judgement a band, in the order given
 * Throws RangeError on a threshold of 0 dB or less.
 * Source: our own rule, put together from ISO 5725 (spread), Student's t and Benjamini and Hochberg 1995.
 * Example: one band, 8 dB in five reference runs, 2 dB in one run of the build, 0.7 dB spread: lost, -6 dB.
 */
export function judgeBuild(input: BuildInput): BandJudgement[] {
  if (!(input.thresholdDb > 0)) throw new RangeError(`the threshold must be above 0 dB, not ${input.thresholdDb} dB`);
  const examined = examine(input);
  const tests = examined.map(({ test }) => test).filter((test) => test !== null);
  const lossP = adjustByBenjaminiHochberg(tests.map((test) => test.lossP));
  const gainP = adjustByBenjaminiHochberg(tests.map((test) => test.gainP));
  const adjusted = new Map(tests.map((test, index) => [test, { lossP: lossP[index], gainP: gainP[index] }]));
  return examined.map(({ series, band, comparison, spread, test }) => {
    const adjustedP = test && adjusted.get(test);
    return 'refused' in comparison || !test || !adjustedP
      ? refuseBand(input, series, band, 'refused' in comparison ? comparison.refused : [])
      : judgeBand(input, series, band, { ...comparison, spread, test, adjustedP });
  });
}
