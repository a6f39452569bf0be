import { formatDecibels } from '@shared/units/format-decibels';
import type { Reason } from './band-judgement';
import type { RunMargin } from './run-margin';
import type { Side } from './side';

/** A level this far above background or floor is the product's own to within 1 dB. Common practice: 10 log10(1 + 10^-0.6) = 0.97 dB. */
const CLEAR_DISTANCE_DB = 6;

/**
 * Why the worst point of a sweep may not be the product's own, or null.
 *
 * Background: less than 6 dB below the level. Floor: so near to limit - target margin that a line there would be hidden
 * (less than 6 dB below it), and the worst point does not stand 6 dB above it. A background far below the point shows that a
 * high floor is the product's own broadband emission, and lifts the second rule.
 * Source: background 6 dB below, common practice after CISPR 16-2-1, 6.2 (ambient); the floor rule is our own definition.
 */
function maskOf(sweep: RunMargin, targetMarginDb: number): Reason | null {
  const { backgroundLevelDbuv, levelDbuv, floorMarginDb, marginDb } = sweep;
  if (backgroundLevelDbuv !== null) {
    const aboveDb = levelDbuv - backgroundLevelDbuv;
    if (aboveDb >= CLEAR_DISTANCE_DB) return null;
    const text = `not distinguishable from background: the level is ${formatDecibels(aboveDb)} above it, 6 dB are needed`;
    return { code: 'nearBackground', text };
  }
  if (floorMarginDb === null || floorMarginDb >= targetMarginDb + CLEAR_DISTANCE_DB) return null;
  if (floorMarginDb - marginDb >= CLEAR_DISTANCE_DB) return null;
  const text = `not assessed: the floor lies ${formatDecibels(floorMarginDb)} below the limit, ${formatDecibels(targetMarginDb + CLEAR_DISTANCE_DB)} are needed`;
  return { code: 'floorTooHigh', text };
}

/** The mask of a side: the first one found when half of its sweeps or more are masked. */
export function maskOfSide(side: Side, targetMarginDb: number): Reason | null {
  const masks = side.sweeps.map((sweep) => maskOf(sweep, targetMarginDb)).filter((mask) => mask !== null);
  return masks.length * 2 >= side.sweeps.length ? (masks[0] ?? null) : null;
}
