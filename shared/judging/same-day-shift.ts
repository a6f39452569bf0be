import { formatSignedDecibels } from '@shared/units/format-decibels';
import type { GuardHit } from './guard-hit';

/** What another product measured on the same bench and day did in the same band, against its own reference. */
export interface OtherProductShift {
  readonly productName: string;
  readonly differenceDb: number;
}

/** Two shifts of one cause agree within this, or within a quarter of the shift when that is more. Our own definition. */
const ALIKE_DB = 1;
const ALIKE_SHARE = 0.25;

/**
 * Tells whether other products moved the same way on the same bench and day.
 *
 * A hit needs more products that moved alike than products that did not: one that stood still is evidence for the bench.
 *
 * @param differenceDb change of the product's margin in a band, dB
 * @param others changes of other products in that band, same bench and day; products measured with no change belong in it
 * @param thresholdDb changes smaller than this are none, dB
 * @returns the sign that the bench moved, or null
 * Source: our own definition; unrelated products do not change together, a bench changes all.
 * Example: -4.1 dB with another product at -4.4 dB is a hit; with that one and two at 0 dB it is none.
 */
export function sameDayShift(
  differenceDb: number,
  others: readonly OtherProductShift[],
  thresholdDb: number,
): GuardHit | null {
  const sizeDb = Math.abs(differenceDb);
  if (sizeDb < thresholdDb) return null;
  const alike = others.filter((other) => {
    const apartDb = Math.abs(other.differenceDb - differenceDb);
    return Math.abs(other.differenceDb) >= thresholdDb / 2 && apartDb <= Math.max(ALIKE_DB, ALIKE_SHARE * sizeDb);
  });
  if (alike.length === 0 || alike.length * 2 <= others.length) return null;
  const named = alike.map((other) => `${other.productName} (${formatSignedDecibels(other.differenceDb)})`).join(', ');
  const text = `on the same bench and day ${named} moved the same way (${formatSignedDecibels(differenceDb)} here)`;
  return { code: 'sameDayShift', text };
}
