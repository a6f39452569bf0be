import type { Detector, Line } from '@shared/detectors/detectors';
import type { GuardCode } from './guard-hit';
import type { Verdict } from './verdict';

export const REFUSAL_CODES = [
  'notMeasured',
  'noReference',
  'limitDiffers',
  'rbwOutOfTolerance',
  'correctionUnknown',
  'correctionDiffers',
  'bandNotCovered',
  'staleTrace',
] as const;

/** Why two sides were not compared at all. */
export type RefusalCode = (typeof REFUSAL_CODES)[number];

/** Why a verdict is "cannot say": refused, masked, too uncertain, or a sign that the bench moved. */
export type ReasonCode = RefusalCode | 'nearBackground' | 'floorTooHigh' | 'withinSpread' | GuardCode;

export const REMARK_CODES = [
  'singleRun',
  'runsLeftOut',
  'benchDiffers',
  'unitDiffers',
  'attenuationDiffers',
  'stepDiffers',
  'gridDiffers',
  'rbwNotStated',
  'noBackground',
  'referenceMasked',
  'buildMasked',
  'clearsAverageLine',
] as const;

export type RemarkCode = (typeof REMARK_CODES)[number];

export interface Reason {
  readonly code: ReasonCode;
  readonly text: string;
}

export interface Remark {
  readonly code: RemarkCode;
  readonly text: string;
}

export const SPREAD_SOURCES = ['planning', 'mixed', 'own'] as const;

export interface JudgedSpread {
  readonly sdDb: number;
  readonly degreesOfFreedom: number;
  /** planning: nothing measured yet; mixed: measured, drawn toward the planning value; own: at least 20 degrees of freedom of its own. */
  readonly source: (typeof SPREAD_SOURCES)[number];
  /** `source` in words, with the runs it rests on. */
  readonly text: string;
}

/** The worst of the build's runs now. */
export interface WorstPoint {
  readonly sweepId: number;
  readonly marginDb: number;
  readonly frequencyHz: number;
  readonly levelDbuv: number;
  readonly limitDbuv: number;
}

/** The change cut in two: differenceDb = limitChangeDb - levelChangeDb. */
export interface PointMove {
  readonly moved: boolean;
  readonly fromHz: number;
  readonly toHz: number;
  readonly levelChangeDb: number;
  readonly limitChangeDb: number;
}

export interface BandJudgement {
  readonly stateId: number;
  readonly stateName: string;
  readonly line: Line;
  readonly detector: Detector;
  readonly limitLineKey: string;
  readonly band: string;
  readonly verdict: Verdict;
  /** Mean margin of the build's runs less that of the reference's; negative = lost. Null when refused, as all to `interval`. */
  readonly differenceDb: number | null;
  readonly halfWidthDb: number | null;
  /** The 90 % interval of the difference. */
  readonly interval: readonly [number, number] | null;
  /** One-sided, in the direction of the difference. */
  readonly p: number | null;
  /** `p` after Benjamini and Hochberg over all bands and states judged for this build. */
  readonly adjustedP: number | null;
  readonly thresholdDb: number;
  readonly targetMarginDb: number;
  readonly spread: JudgedSpread | null;
  readonly buildRuns: number;
  readonly referenceRuns: number;
  /** True when either side rests on one run. */
  readonly singleRun: boolean;
  readonly meanMarginDb: number | null;
  readonly referenceMeanMarginDb: number | null;
  readonly previousDifferenceDb: number | null;
  /** Null only when the build was not measured in this band. Kept when the comparison was refused. */
  readonly worst: WorstPoint | null;
  readonly referenceWorst: WorstPoint | null;
  readonly move: PointMove | null;
  readonly overLimit: boolean;
  readonly underTarget: boolean;
  /** Chance that the product meets the limit; null unless the team entered its uncertainty. */
  readonly pConform: number | null;
  readonly reasons: readonly Reason[];
  readonly remarks: readonly Remark[];
  /** What would settle a "cannot say", in plain words, most useful first. */
  readonly settles: readonly string[];
  readonly buildSweepIds: readonly number[];
  readonly referenceSweepIds: readonly number[];
}
