import type { Detector } from '../detectors/detectors';
import { probit } from 'simple-statistics';
import { detectEnvelope } from './detect-envelope';
import type { RandomGenerator } from './random-generator';
import { BAND_B_BANDWIDTH_HZ } from './receiver-filter';

/** The receiver and what stands before it. Losses in dB, 0 or more. */
export interface ReceiverChain {
  noiseFigureDb: number;
  attenuationDb: number;
  /** External pad or limiter really in the cable. */
  padDb: number;
  /** Its loss as entered in the corrections; differs from padDb only when somebody forgot. */
  enteredPadDb: number;
  /** Time at each tuned frequency, s. */
  dwellS: number;
}

const TABLE_SIZE = 4096;
/** Impulse bandwidth of a Gaussian filter over its 6 dB bandwidth. Source: CISPR 16-1-1; 1.0645 for the Gaussian shape. */
const IMPULSE_BANDWIDTH_HZ = 1.0645 * BAND_B_BANDWIDTH_HZ;
const BOLTZMANN_J_PER_K = 1.380649e-23;
const ROOM_K = 290;
const RECEIVER_OHM = 50;
/** Standard deviation of a Rayleigh envelope over its mean: sqrt(4 / pi - 1). */
const RAYLEIGH_VARIATION = 0.5227;
/** Spread of a quasi-peak reading of noise over its mean; our own assumption, 0.25 dB. */
const QUASI_PEAK_VARIATION = 0.03;

/**
 * Rms noise of the receiver, as corrected for the entered pad.
 *
 * U = sqrt(k T B R) * 10^((F + attenuation + entered pad) / 20), B = 9.58 kHz
 *
 * @param chain noise figure, attenuation and entered pad in dB
 * @returns rms microvolts in 50 ohm
 * Source: thermal noise, Johnson and Nyquist 1928; matched source of 50 ohm at 290 K.
 * @example noiseRmsMicrovolts({ noiseFigureDb: 0, attenuationDb: 0, padDb: 0, enteredPadDb: 0, dwellS: 0.1 }) // 0.0438, -27.2 dBuV
 */
export function noiseRmsMicrovolts(chain: ReceiverChain): number {
  const thermalV = Math.sqrt(BOLTZMANN_J_PER_K * ROOM_K * IMPULSE_BANDWIDTH_HZ * RECEIVER_OHM);
  return thermalV * 1e6 * 10 ** ((chain.noiseFigureDb + chain.attenuationDb + chain.enteredPadDb) / 20);
}

/** Draws readings of pure Gaussian noise over its rms value. */
export type NoiseDraws = Record<Detector, (random: RandomGenerator) => number>;

/**
 * Prepares draws of what each detector reads of Gaussian noise, relative to the noise's rms value.
 *
 * The envelope is Rayleigh. AV = sqrt(pi) / 2 (-1.05 dB) with sd 0.52 / sqrt(m); PK = sqrt(-ln(1 - u^(1/m))), the largest of
 * m = dwell * B_imp independent envelopes (8.4 dB at 100 ms); QP from charge and discharge balance over the Rayleigh distribution.
 *
 * @param dwellS time at each frequency in s, above 0.001
 * @returns one draw a detector
 * Throws RangeError when the dwell is shorter than ten independent envelopes.
 * Source: S. O. Rice 1944, Bell Syst. Tech. J. 23 (envelope of noise); order statistics of the Rayleigh distribution.
 * @example the mean of noiseDraws(0.1).AV over many draws is 0.886
 */
export function noiseDraws(dwellS: number): NoiseDraws {
  const independent = dwellS * IMPULSE_BANDWIDTH_HZ;
  if (independent < 10) {
    throw new RangeError(`the dwell must be at least ${(10 / IMPULSE_BANDWIDTH_HZ).toFixed(5)} s, got ${dwellS} s`);
  }
  const probabilities = Float64Array.from({ length: TABLE_SIZE }, (_, index) => (index + 0.5) / TABLE_SIZE);
  const rayleigh = probabilities.map((p) => Math.sqrt(-Math.log(1 - p)));
  const { quasiPeak, average } = detectEnvelope(rayleigh);
  const peakTable = probabilities.map((p) => Math.sqrt(-Math.log(1 - p ** (1 / independent))));
  const normalTable = probabilities.map((p) => probit(p));
  const pick = (random: RandomGenerator): number => (random.next() * TABLE_SIZE) | 0;
  const averageVariation = RAYLEIGH_VARIATION / Math.sqrt(independent);
  return {
    PK: (random) => peakTable[pick(random)],
    QP: (random) => quasiPeak * (1 + QUASI_PEAK_VARIATION * normalTable[pick(random)]),
    AV: (random) => average * (1 + averageVariation * normalTable[pick(random)]),
  };
}
