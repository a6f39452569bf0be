import type { JudgedSpread } from './band-judgement';
import { halfWidthDb, lossP } from './test-change';

/** Beyond this a repeat is no answer any more. */
const MOST_RUNS = 12;
/** Adjusted p at or below which a change is called. */
export const CALLED_P = 0.01;

export interface OpenQuestion {
  readonly differenceDb: number;
  readonly thresholdDb: number;
  readonly spread: Pick<JudgedSpread, 'sdDb' | 'degreesOfFreedom'>;
  readonly buildRuns: number;
  readonly referenceRuns: number;
  /** Adjusted over unadjusted p as of now, 1 or more. */
  readonly adjustment: number;
}

export interface RunsNeeded {
  readonly buildRuns: number;
  readonly referenceRuns: number;
}

/**
 * How many more runs would settle a "cannot say", should the difference stay where it is.
 *
 * Inside the threshold: until the 90 % interval fits inside it. Beyond: until the adjusted p is 0.01 or less. Each run adds a
 * degree of freedom. Runs of this build are tried first, then the same number of the reference as well.
 *
 * @param question the test as it stands; dB
 * @returns the least numbers of further runs, or null when 12 of each would not do
 * Source: our own definition, from the rule of the verdict itself.
 * Example: no difference, 2 dB threshold, 0.7 dB with 4 degrees of freedom, one run against one: 1 more of this build.
 */
export function runsToSettle(question: OpenQuestion): RunsNeeded | null {
  for (const withReference of [false, true]) {
    for (let more = 1; more <= MOST_RUNS; more++) {
      const needed = { buildRuns: more, referenceRuns: withReference ? more : 0 };
      if (wouldSettle(question, needed)) return needed;
    }
  }
  return null;
}

function wouldSettle(question: OpenQuestion, more: RunsNeeded): boolean {
  const { differenceDb, thresholdDb, adjustment } = question;
  const spread = {
    sdDb: question.spread.sdDb,
    degreesOfFreedom: question.spread.degreesOfFreedom + more.buildRuns + more.referenceRuns,
  };
  const buildRuns = question.buildRuns + more.buildRuns;
  const referenceRuns = question.referenceRuns + more.referenceRuns;
  const sizeDb = Math.abs(differenceDb);
  if (sizeDb < thresholdDb) return sizeDb + halfWidthDb(spread, buildRuns, referenceRuns) < thresholdDb;
  return adjustment * lossP(-sizeDb, spread, buildRuns, referenceRuns) <= CALLED_P;
}
