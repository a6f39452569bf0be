import { aBand, aRun, aSeries } from '../../test/builders/judging';
import type { BandJudgement } from './band-judgement';
import { judgeBuild } from './judge-build';

const BANDS = 12;
const STATES = 4;
const EARLIER_BUILDS = 5;

/** Seeded generator of numbers from 0 to 1 (mulberry32, public domain). */
function mulberry32(seed: number): () => number {
  let state = seed;
  return () => {
    state = (state + 0x6d2b79f5) | 0;
    let t = Math.imul(state ^ (state >>> 15), 1 | state);
    t = (t + Math.imul(t ^ (t >>> 7), 61 | t)) ^ t;
    return ((t ^ (t >>> 14)) >>> 0) / 4294967296;
  };
}

/** Session shift and run noise of 0.5 dB each, one run a build; `lossDb` in the first band of the first state. */
function judgeSimulated(random: () => number, lossDb: number) {
  const normal = () => Math.sqrt(-2 * Math.log(1 - random())) * Math.cos(2 * Math.PI * random());
  const series = Array.from({ length: STATES }, (_, stateId) => {
    const shiftsDb = Array.from({ length: EARLIER_BUILDS + 1 }, () => 0.5 * normal());
    const bands = Array.from({ length: BANDS }, (_, band) => {
      const runs = shiftsDb.map((shiftDb, build) => {
        const isLossy = build === EARLIER_BUILDS && stateId === 0 && band === 0;
        const marginDb = 10 + shiftDb + 0.5 * normal() - (isLossy ? lossDb : 0);
        return aRun({ buildId: build, run: `${stateId}-${build}`, marginDb });
      });
      const reference = runs.slice(0, EARLIER_BUILDS);
      return aBand({ band: `${band}`, build: runs.slice(EARLIER_BUILDS), reference, history: reference });
    });
    return aSeries({ stateId, bands });
  });
  return judgeBuild({ series, thresholdDb: 2, targetMarginDb: 6 });
}

/** Share of simulated builds of which `is` holds. */
function shareOf(builds: number, lossDb: number, is: (judgements: BandJudgement[]) => boolean): number {
  const random = mulberry32(20260302);
  let count = 0;
  for (let i = 0; i < builds; i++) if (is(judgeSimulated(random, lossDb))) count++;
  return count / builds;
}

// Truth is known here: the data are simulated, not taken from a source.
describe('judging simulated builds of single runs after five builds, 12 bands in 4 states', () => {
  it('calls anything lost or gained in at most 2 of 100 clean builds', () => {
    const isCalled = ({ verdict }: BandJudgement) => verdict === 'lost' || verdict === 'gained';
    expect(shareOf(250, 0, (judged) => judged.some(isCalled))).toBeLessThanOrEqual(0.02);
  });

  it('finds a loss of 6 dB in one band in at least 95 of 100', () => {
    expect(shareOf(60, 6, (judged) => judged[0].verdict === 'lost')).toBeGreaterThanOrEqual(0.95);
  });

  it('says held of a band that lost just the threshold in 5 of 100, as a 90 % interval does', () => {
    // 200 builds scatter by 1.5 of 100: two of those on top.
    expect(shareOf(200, 2, (judged) => judged[0].verdict === 'held')).toBeLessThanOrEqual(0.05 + 2 * 0.015);
  });
});
