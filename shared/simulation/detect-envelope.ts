/** Readings of the three detectors, calibrated so that a steady sine reads the same on all of them. */
export interface DetectorReadings {
  peak: number;
  quasiPeak: number;
  average: number;
}

/** Discharge time constant of the quasi-peak detector in band B, s. Source: CISPR 16-1-1. */
const DISCHARGE_S = 0.16;
/** S C with a sine step reaching 63 % in the charge time of 1 ms. Own simulation of the CISPR 16-1-1 detector. */
const CHARGE_S = 0.254e-3;
const BALANCE = CHARGE_S / DISCHARGE_S;

const TABLE_SIZE = 4096;
const CHARGE_TABLE = Float64Array.from({ length: TABLE_SIZE + 2 }, (_, index) => {
  const angle = Math.acos(Math.min(1, index / TABLE_SIZE));
  return (Math.sin(angle) - angle * Math.cos(angle)) / Math.PI;
});
const SINE_READING = solveBalance((level) => chargeOf(1, level), 0.5, 1);

/**
 * Peak, quasi-peak and average reading of a signal whose envelope repeats.
 *
 * PK = max A. AV = mean A. QP is the capacitor voltage v at which charge and discharge balance over the cycle:
 * mean of g(A, v) = v * (S C) / (R C), g = (A / pi) (sin p - p cos p), cos p = v / A; divided by the v of a steady sine.
 *
 * @param envelope amplitudes at equal times over one cycle, linear, 0 or more, at least one
 * @param count how many of the entries are used
 * @returns the three readings in the unit of the envelope; peak >= quasiPeak >= average
 * Throws RangeError when there is no sample.
 * Source: CISPR 16-1-1 time constants (charge 1 ms, discharge 160 ms). The balance holds while the capacitor's ripple is small,
 * from about 50 repetitions a second upwards; the meter's own time constant is not simulated.
 * @example detectEnvelope([1, 1, 0, 0]) // peak 1, quasiPeak 0.983, average 0.5
 */
export function detectEnvelope(envelope: ArrayLike<number>, count: number = envelope.length): DetectorReadings {
  if (count < 1) {
    throw new RangeError(`an envelope needs at least one sample, got ${count}`);
  }
  let peak = 0;
  let sum = 0;
  for (let index = 0; index < count; index++) {
    sum += envelope[index];
    if (envelope[index] > peak) peak = envelope[index];
  }
  const average = sum / count;
  if (peak - average <= peak * 1e-9) {
    return { peak, quasiPeak: peak, average };
  }
  const meanCharge = (level: number): number => {
    let charge = 0;
    for (let index = 0; index < count; index++) charge += chargeOf(envelope[index], level);
    return charge / count;
  };
  const level = solveBalance(meanCharge, average * SINE_READING, peak * SINE_READING);
  return { peak, quasiPeak: level / SINE_READING, average };
}

/** Mean charging of one carrier cycle, g(A, v), from a table: A h(v / A). */
function chargeOf(amplitude: number, level: number): number {
  if (amplitude <= level) return 0;
  const position = (level / amplitude) * TABLE_SIZE;
  const index = position | 0;
  const below = CHARGE_TABLE[index];
  return amplitude * (below + (position - index) * (CHARGE_TABLE[index + 1] - below));
}

/** Bisection between two levels: the quasi-peak reading always lies between average and peak. */
function solveBalance(meanCharge: (level: number) => number, low: number, high: number): number {
  let below = low;
  let above = high;
  for (let step = 0; step < 18; step++) {
    const middle = (below + above) / 2;
    if (meanCharge(middle) > middle * BALANCE) below = middle;
    else above = middle;
  }
  return (below + above) / 2;
}
