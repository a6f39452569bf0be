export interface InterpolatedPeak {
  readonly frequencyHz: number;
  readonly levelDbuv: number;
}

/**
 * Places the top of a resolved line between grid points, by the parabola through a point and its two neighbours.
 * Formula (Newton form, any spacing): s1 = (y0 - y-) / (f0 - f-), s2 = (y+ - y0) / (f+ - f0), c = (s2 - s1) / (f+ - f-);
 * top at f0 - (s1 + c (f0 - f-)) / (2 c), moved at most half a step; the level is the parabola's there.
 * @param frequenciesHz strictly rising frequencies in Hz
 * @param levelsDbuv levels in dB, one a frequency
 * @param index point to refine
 * @returns frequency in Hz and level in dB, or null when the point is no local maximum between two neighbours: then
 * there is nothing to refine
 * Source: a Gaussian filter is a parabola on a dB scale, so three points give its top exactly without noise; the
 * limit of half a step and the test for a concave shape keep noise from carrying the result away (our own definition).
 * Example: levels 40, 46, 44 dB at 1000, 1004.5, 1009 kHz give 1005.625 kHz and 46.25 dB.
 */
export function interpolatePeak(
  frequenciesHz: Float64Array,
  levelsDbuv: Float32Array,
  index: number,
): InterpolatedPeak | null {
  if (index <= 0 || index >= levelsDbuv.length - 1) return null;
  const level = levelsDbuv[index];
  const riseDb = level - levelsDbuv[index - 1];
  const fallDb = levelsDbuv[index + 1] - level;
  if (!(riseDb >= 0 && fallDb <= 0 && riseDb > fallDb)) return null;

  const centreHz = frequenciesHz[index];
  const stepBelowHz = centreHz - frequenciesHz[index - 1];
  const stepAboveHz = frequenciesHz[index + 1] - centreHz;
  const slopeBelow = riseDb / stepBelowHz;
  const curvature = (fallDb / stepAboveHz - slopeBelow) / (stepBelowHz + stepAboveHz);
  const slopeAtCentre = slopeBelow + curvature * stepBelowHz;
  const topHz = -slopeAtCentre / (2 * curvature);
  const offsetHz = Math.max(-stepBelowHz / 2, Math.min(stepAboveHz / 2, topHz));
  return {
    frequencyHz: centreHz + offsetHz,
    levelDbuv: level + (slopeAtCentre + curvature * offsetHz) * offsetHz,
  };
}
