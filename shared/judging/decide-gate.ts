import { formatDecibels, formatSignedDecibels } from '@shared/units/format-decibels';
import { formatFrequency } from '@shared/units/format-frequency';
import type { Detector, Line } from '@shared/detectors/detectors';
import type { BandJudgement } from './band-judgement';

export const GATE_VERDICTS = ['pass', 'fail', 'incomplete'] as const;
export type GateVerdict = (typeof GATE_VERDICTS)[number];

export const GATE_REASON_CODES = ['overLimit', 'underTarget', 'lost', 'notMeasured', 'notJudged', 'cannotSay'] as const;
export type GateReasonCode = (typeof GATE_REASON_CODES)[number];

export interface GateReason {
  readonly code: GateReasonCode;
  readonly text: string;
}

/** A series the product must be measured in, named as its judgements name it. */
export interface RequiredSeries {
  readonly stateName: string;
  readonly line: Line;
  readonly detector: Detector;
  /** Bands that must have been measured. */
  readonly bands: readonly string[];
}

export interface GateInput {
  /** Latest judgements of the build; empty when it was not judged. */
  readonly judgements: readonly BandJudgement[];
  /** False while sweeps or the reference are newer than the judgements. */
  readonly isJudged: boolean;
  /** Takes the place of the target the judgements were made with. */
  readonly targetMarginDb: number;
  readonly required: readonly RequiredSeries[];
}

export interface GateDecision {
  readonly verdict: GateVerdict;
  readonly reasons: readonly GateReason[];
}

type SeriesBand = Pick<BandJudgement, 'stateName' | 'line' | 'detector' | 'band'>;

function place({ stateName, line, detector, band }: SeriesBand): string {
  return `${stateName}, ${line} ${detector}, ${band}`;
}

/** Faults of a band that stop a release. */
function faults(judgement: BandJudgement, targetMarginDb: number): GateReason[] {
  const { worst, overLimit, verdict, differenceDb } = judgement;
  const reasons: GateReason[] = [];
  if (worst) {
    const at = `${place(judgement)}: ${formatDecibels(worst.marginDb)} at ${formatFrequency(worst.frequencyHz)}`;
    if (overLimit) reasons.push({ code: 'overLimit', text: `${at} is over the limit` });
    else if (worst.marginDb < targetMarginDb) {
      reasons.push({
        code: 'underTarget',
        text: `${at} is short of the target margin of ${formatDecibels(targetMarginDb)}`,
      });
    }
  }
  if (verdict === 'lost' && differenceDb !== null) {
    reasons.push({ code: 'lost', text: `${place(judgement)}: lost ${formatDecibels(-differenceDb)} of margin` });
  }
  return reasons;
}

/** A first build and an interval still too wide are no gaps in the data: its margin to the target was measured all the same. */
function openQuestion(judgement: BandJudgement): GateReason[] {
  if (judgement.verdict !== 'cannotSay') return [];
  const stops = judgement.reasons.filter(
    ({ code }) => code !== 'noReference' && code !== 'withinSpread' && code !== 'notMeasured',
  );
  const suspicious =
    stops.length === 0 && judgement.differenceDb !== null && judgement.differenceDb <= -judgement.thresholdDb;
  if (suspicious && judgement.differenceDb !== null) {
    const text = `${place(judgement)}: ${formatSignedDecibels(judgement.differenceDb)}, cannot say whether that is a loss`;
    return [{ code: 'cannotSay', text }];
  }
  return stops.map(({ text }) => ({ code: 'cannotSay', text: `${place(judgement)}: cannot say: ${text}` }));
}

function gaps({ judgements, required }: GateInput): GateReason[] {
  const measured = new Set(judgements.filter(({ worst }) => worst !== null).map(place));
  const wanted = required.flatMap((series) => series.bands.map((band) => ({ ...series, band })));
  const missing = [...new Set(wanted.map(place))].filter((name) => !measured.has(name));
  return missing.map((name) => ({ code: 'notMeasured', text: `${name}: not measured` }));
}

/**
 * Decides whether a build may pass a release pipeline.
 *
 * Fail: a band over the limit, short of the target margin, or lost. Incomplete: something required was not measured, the
 * judgement is missing or outdated, or a guard stopped a verdict, or a loss beyond the threshold is not yet settled. Pass:
 * none of these. A fault outweighs a gap, and both are listed.
 *
 * @param input judgements of the build in dB, target margin in dB, what must have been measured
 * @returns the verdict with every reason, faults first
 * Throws RangeError when nothing is required: a gate over nothing would always pass.
 * Source: our own definition.
 * Example: all required bands held with 7 dB at a target of 6 dB: pass.
 */
export function decideGate(input: GateInput): GateDecision {
  if (input.required.length === 0) throw new RangeError('a gate must require at least one series');
  const failed = input.judgements.flatMap((judgement) => faults(judgement, input.targetMarginDb));
  const notJudged: GateReason[] = input.isJudged
    ? []
    : [{ code: 'notJudged', text: 'the build is not judged, or has sweeps newer than its judgement' }];
  const open = [...notJudged, ...gaps(input), ...input.judgements.flatMap(openQuestion)];
  const verdict = failed.length > 0 ? 'fail' : open.length > 0 ? 'incomplete' : 'pass';
  return { verdict, reasons: [...failed, ...open] };
}
