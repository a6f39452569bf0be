import type { FrequencyRaster } from './emission-spectrum';
import type { RandomGenerator } from './random-generator';

// NOTE: taken once: looking Math up in every turn of these loops is ten times slower in a test runner's sandbox.
const { floor, log, min } = Math;

/**
 * Draws a level error that changes slowly over frequency.
 *
 * A common offset plus knots on a logarithmic frequency axis, joined by straight lines.
 *
 * @param spread standard deviation of the offset and of each knot in dB, and the number of knots (2 or more) over the span
 * @param raster tuned frequencies in Hz
 * @param random the stream of random numbers
 * @returns dB to add to the level, one value a tuned frequency
 * Source: our own definition; the sizes used follow planning values of repeatability, 0.5-1 dB when a set-up is made anew.
 * @example with offsetDb 0 and knotDb 0 every value is 0
 */
export function drawLevelCurve(
  spread: { offsetDb: number; knotDb: number; knots: number },
  raster: FrequencyRaster,
  random: RandomGenerator,
): Float32Array {
  const offsetDb = spread.offsetDb * random.nextNormal();
  const knotsDb = Array.from({ length: spread.knots }, () => spread.knotDb * random.nextNormal());
  const endHz = raster.startHz + raster.stepHz * (raster.pointCount - 1);
  const perNeper = (spread.knots - 1) / log(endHz / raster.startHz);
  const curve = new Float32Array(raster.pointCount);
  for (let point = 0; point < raster.pointCount; point++) {
    const position = log(1 + (point * raster.stepHz) / raster.startHz) * perNeper;
    const below = min(spread.knots - 2, floor(position));
    curve[point] = offsetDb + knotsDb[below] + (position - below) * (knotsDb[below + 1] - knotsDb[below]);
  }
  return curve;
}
