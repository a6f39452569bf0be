import type { BandJudgement, JudgedSpread, PointMove, Reason, Remark, WorstPoint } from './band-judgement';
import type { BandInput, BuildInput, SeriesInput } from './build-input';
import { compareSetUps } from './compare-set-ups';
import { decideVerdict, nameSide } from './decide-verdict';
import { maskOfSide } from './masked-point';
import { hasMargin } from './refuse-run';
import { remarkEvidence } from './remark-evidence';
import type { RunMargin } from './run-margin';
import { runsToSettle } from './runs-to-settle';
import { settlesFor } from './settle-words';
import { summariseSide, type Side } from './side';
import { standing } from './standing';
import type { ChangeTest } from './test-change';

/** Half the RBW of band B, Hz: two worst points closer than this are one line. Source: CISPR 16-1-1, 9 kHz. */
const SAME_LINE_HZ = 4_500;

export interface ComparedBand {
  readonly build: Side;
  readonly reference: Side;
  readonly remarks: readonly Remark[];
  readonly spread: JudgedSpread;
  readonly test: ChangeTest;
  readonly adjustedP: { readonly lossP: number; readonly gainP: number };
}

function identity(input: BuildInput, series: SeriesInput, band: BandInput) {
  const { stateId, stateName, line, detector, limitLineKey } = series;
  const { thresholdDb, targetMarginDb } = input;
  return { stateId, stateName, line, detector, limitLineKey, band: band.band, thresholdDb, targetMarginDb };
}

function worstPoint({ worst }: Side): WorstPoint {
  const { sweepId, marginDb, frequencyHz, levelDbuv, limitDbuv } = worst;
  return { sweepId, marginDb, frequencyHz, levelDbuv, limitDbuv };
}

function movedPoint(build: Side, reference: Side): PointMove {
  const apartHz = Math.abs(build.worst.frequencyHz - reference.worst.frequencyHz);
  const stepHz = Math.max(build.worst.stepHz, reference.worst.stepHz);
  return {
    moved: apartHz > Math.max(SAME_LINE_HZ, stepHz),
    fromHz: reference.worst.frequencyHz,
    toHz: build.worst.frequencyHz,
    levelChangeDb: build.meanLevelDbuv - reference.meanLevelDbuv,
    limitChangeDb: build.meanLimitDbuv - reference.meanLimitDbuv,
  };
}

const sweepIds = (sweeps: readonly RunMargin[]) => sweeps.map(({ sweepId }) => sweepId).sort((a, b) => a - b);

const sideOrNull = (sweeps: readonly RunMargin[]) => (sweeps.length > 0 ? summariseSide(sweeps) : null);

/** A band that could not be compared; where the build stands to the limit is stated all the same. */
export function refuseBand(
  input: BuildInput,
  series: SeriesInput,
  band: BandInput,
  reasons: readonly Reason[],
): BandJudgement {
  const build = sideOrNull(band.build);
  const reference = sideOrNull(band.reference);
  const mask = build && maskOfSide(build, input.targetMarginDb);
  const allReasons = mask ? [...reasons, nameSide('this build', mask)] : reasons;
  return {
    ...identity(input, series, band),
    verdict: 'cannotSay',
    differenceDb: null,
    halfWidthDb: null,
    interval: null,
    p: null,
    adjustedP: null,
    spread: null,
    buildRuns: build?.runCount ?? 0,
    referenceRuns: reference?.runCount ?? 0,
    singleRun: build?.runCount === 1 || reference?.runCount === 1,
    meanMarginDb: build?.meanMarginDb ?? null,
    referenceMeanMarginDb: reference?.meanMarginDb ?? null,
    previousDifferenceDb: null,
    worst: build && worstPoint(build),
    referenceWorst: reference && worstPoint(reference),
    move: null,
    ...standing(build?.worst.marginDb ?? null, input),
    reasons: allReasons,
    remarks: [],
    settles: settlesFor(allReasons, null),
    buildSweepIds: sweepIds(band.build),
    referenceSweepIds: sweepIds(band.reference),
  };
}

/** The judgement of a band whose two sides may be compared. */
export function judgeBand(
  input: BuildInput,
  series: SeriesInput,
  band: BandInput,
  { build, reference, remarks, spread, test, adjustedP }: ComparedBand,
): BandJudgement {
  const { thresholdDb, targetMarginDb } = input;
  const buildMask = maskOfSide(build, targetMarginDb);
  const referenceMask = maskOfSide(reference, targetMarginDb);
  const { verdict, reasons } = decideVerdict({
    test,
    adjustedLossP: adjustedP.lossP,
    adjustedGainP: adjustedP.gainP,
    thresholdDb,
    buildMask,
    referenceMask,
    guards: band.guards,
  });
  const isLoss = test.differenceDb < 0;
  const p = isLoss ? test.lossP : test.gainP;
  const pAdjusted = isLoss ? adjustedP.lossP : adjustedP.gainP;
  const buildRuns = build.runCount;
  const referenceRuns = reference.runCount;
  const isOpen = reasons.some(({ code }) => code === 'withinSpread');
  const adjustment = p > 0 ? pAdjusted / p : 1;
  const question = { ...test, thresholdDb, spread, buildRuns, referenceRuns, adjustment };
  const previous = sideOrNull(band.previous);
  const standingSide = summariseSide(band.build.filter((sweep) => hasMargin(sweep, series.limitLineKey)));
  const evidence = { build, reference, buildMask, referenceMask, verdict, detector: series.detector };
  return {
    ...identity(input, series, band),
    verdict,
    differenceDb: test.differenceDb,
    halfWidthDb: test.halfWidthDb,
    interval: [test.differenceDb - test.halfWidthDb, test.differenceDb + test.halfWidthDb],
    p,
    adjustedP: pAdjusted,
    spread,
    buildRuns,
    referenceRuns,
    singleRun: buildRuns === 1 || referenceRuns === 1,
    meanMarginDb: build.meanMarginDb,
    referenceMeanMarginDb: reference.meanMarginDb,
    previousDifferenceDb: previous && build.meanMarginDb - previous.meanMarginDb,
    worst: worstPoint(standingSide),
    referenceWorst: worstPoint(reference),
    move: movedPoint(build, reference),
    ...standing(standingSide.worst.marginDb, input),
    reasons,
    remarks: [...remarks, ...compareSetUps(build, reference), ...remarkEvidence(evidence)],
    settles: settlesFor(reasons, isOpen ? runsToSettle(question) : null),
    buildSweepIds: sweepIds(build.sweeps),
    referenceSweepIds: sweepIds(reference.sweeps),
  };
}
