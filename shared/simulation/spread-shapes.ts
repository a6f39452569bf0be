import { type SpreadShape, spreadShape } from './spread-line';
import type { Spreading } from './switching-stage';

/** Below this excursion the line is a steady one: the 9 kHz filter hardly sees it (average 0.03 dB lower). */
const SMALLEST_EXCURSION_HZ = 1000;
const SHAPES_PER_OCTAVE = 12;

/** Gives the shape of a modulated line, or null when its excursion is too small to matter. */
export type SpreadShapes = (excursionHz: number, spreading: Spreading) => SpreadShape | null;

/**
 * Makes a keeper of spread shapes that computes each only once, on a raster of 12 excursions an octave.
 *
 * @returns the lookup; its shape's excursion is within 3 % of the one asked for
 * @example createSpreadShapes()(500, { peakToPeakPercent: 0.5, modulationHz: 400, profile: 'sine' }) // null
 */
export function createSpreadShapes(): SpreadShapes {
  const kept = new Map<string, SpreadShape>();
  return (excursionHz, spreading) => {
    if (excursionHz < SMALLEST_EXCURSION_HZ) return null;
    const step = Math.round(Math.log2(excursionHz) * SHAPES_PER_OCTAVE);
    const key = `${spreading.profile} ${spreading.modulationHz} ${step}`;
    let shape = kept.get(key);
    if (shape === undefined) {
      shape = spreadShape(2 ** (step / SHAPES_PER_OCTAVE), spreading.modulationHz, spreading.profile);
      kept.set(key, shape);
    }
    return shape;
  };
}
