import { formatDecibels, formatSignedDecibels } from '@shared/units/format-decibels';
import type { Reason } from './band-judgement';
import type { GuardHit } from './guard-hit';
import { CALLED_P } from './runs-to-settle';
import type { ChangeTest } from './test-change';
import type { Verdict } from './verdict';

export interface TestedBand {
  readonly test: ChangeTest;
  readonly adjustedLossP: number;
  readonly adjustedGainP: number;
  readonly thresholdDb: number;
  /** Why the worst point of a side may not be the product's own. */
  readonly buildMask: Reason | null;
  readonly referenceMask: Reason | null;
  readonly guards: readonly GuardHit[];
}

export interface Decision {
  readonly verdict: Verdict;
  readonly reasons: readonly Reason[];
}

function byNumbers({ test, adjustedLossP, adjustedGainP, thresholdDb }: TestedBand): Verdict {
  if (test.differenceDb <= -thresholdDb && adjustedLossP <= CALLED_P) return 'lost';
  if (test.differenceDb >= thresholdDb && adjustedGainP <= CALLED_P) return 'gained';
  if (Math.abs(test.differenceDb) + test.halfWidthDb < thresholdDb) return 'held';
  return 'cannotSay';
}

function withinSpread({ test, thresholdDb }: TestedBand): Reason {
  const interval = `${formatSignedDecibels(test.differenceDb)} ± ${formatDecibels(test.halfWidthDb)}`;
  const text =
    Math.abs(test.differenceDb) < thresholdDb
      ? `the spread leaves room for a change: ${interval} reaches beyond ${formatDecibels(thresholdDb)}`
      : `the spread could make this change by itself: ${interval}, not certain enough among all bands of this build`;
  return { code: 'withinSpread', text };
}

/**
 * Decides the verdict of a band from its test, its masks and the signs that the bench moved.
 *
 * Lost: d at or below minus the threshold with an adjusted p of 0.01 or less; gained its mirror; held: the 90 % interval
 * inside the threshold; otherwise cannot say. A masked point only bounds the product's own level from above: a build masked
 * by background can still be said to have gained, a masked reference still to have been left behind, nothing else. A sign that
 * the bench moved stops lost and gained.
 *
 * Source: our own definition; two one-sided tests for "held" (Schuirmann 1987), Benjamini-Hochberg for the rest.
 */
export function decideVerdict(band: TestedBand): Decision {
  const numbers = byNumbers(band);
  const reasons: Reason[] = [];
  if (numbers !== 'held') reasons.push(...band.guards.map(({ code, text }) => ({ code, text })));
  if (band.buildMask && numbers !== 'gained') reasons.push(nameSide('this build', band.buildMask));
  if (band.referenceMask && numbers !== 'lost') reasons.push(nameSide('the reference', band.referenceMask));
  if (numbers === 'cannotSay') reasons.push(withinSpread(band));
  return { verdict: reasons.length > 0 ? 'cannotSay' : numbers, reasons };
}

/** Says which side a reason is about. */
export function nameSide(side: 'this build' | 'the reference', { code, text }: Reason): Reason {
  return { code, text: `${side}: ${text}` };
}
