import { type DetectorReadings, detectEnvelope } from './detect-envelope';
import { fourierTransform } from './fourier';
import { FILTER_REACH_HZ, gaussianResponse } from './receiver-filter';
import type { Spreading } from './switching-stage';

// NOTE: taken once: looking Math up in every turn of these loops is ten times slower in a test runner's sandbox.
const { abs, cos, sin, sqrt } = Math;

/** Detector readings of one frequency-modulated line of amplitude 1, against the distance of the tuning from its centre. */
export interface SpreadShape {
  excursionHz: number;
  /** Distances from the centre, rising from 0. The shape is the same on both sides. */
  offsetsHz: Float64Array;
  readings: DetectorReadings[];
}

const FINE_STEP_HZ = 1500;
const INNER_NODES = 12;

/**
 * What the receiver reads around a line whose frequency swings to and fro.
 *
 * The line is split into its sidebands c_k at k fm (Fourier series of exp(j phi(t))), the filter weighs them by G(k fm - offset), and
 * the sum over one modulation period is the envelope the detectors see.
 *
 * @param excursionHz peak-to-peak excursion of the line in Hz, above 0 (n times that of the fundamental)
 * @param modulationHz modulation frequency in Hz, above 0
 * @param profile course of the frequency in time
 * @returns readings from the centre to beyond the edge, relative to the line without modulation
 * Source: Fourier series of a frequency-modulated carrier, exact for the Gaussian filter; detectors by CISPR 16-1-1.
 * @example spreadShape(40e3, 400, 'triangle') // peak about -0.1 dB, quasi-peak -1.3 dB, average -12.2 dB at the highest tuning
 */
export function spreadShape(excursionHz: number, modulationHz: number, profile: Spreading['profile']): SpreadShape {
  const sidebands = sidebandsOf(excursionHz / 2, modulationHz, profile);
  const offsetsHz = tuningOffsets(excursionHz / 2);
  const readings = Array.from(offsetsHz, (offsetHz) => readAt(offsetHz, sidebands, modulationHz));
  return { excursionHz, offsetsHz, readings };
}

interface Sidebands {
  real: Float64Array;
  imaginary: Float64Array;
}

function sidebandsOf(deviationHz: number, modulationHz: number, profile: Spreading['profile']): Sidebands {
  const size = powerOfTwo((8 * (deviationHz + FILTER_REACH_HZ)) / modulationHz);
  const real = new Float64Array(size);
  const imaginary = new Float64Array(size);
  let phase = 0;
  for (let index = 0; index < size; index++) {
    real[index] = cos(phase) / size;
    imaginary[index] = sin(phase) / size;
    const time = (index + 0.5) / size;
    const course = profile === 'triangle' ? 1 - 4 * abs(time - 0.5) : Math.sin(2 * Math.PI * time);
    phase += (2 * Math.PI * deviationHz * course) / (modulationHz * size);
  }
  fourierTransform(real, imaginary);
  return { real, imaginary };
}

function tuningOffsets(deviationHz: number): Float64Array {
  const offsets: number[] = [];
  const edgeStartHz = deviationHz - FILTER_REACH_HZ;
  const firstHz = edgeStartHz > INNER_NODES * FINE_STEP_HZ ? edgeStartHz : 0;
  for (let node = 0; firstHz > 0 && node < INNER_NODES; node++) {
    offsets.push((firstHz * node) / INNER_NODES);
  }
  for (let offsetHz = firstHz; offsetHz < deviationHz + FILTER_REACH_HZ; offsetHz += FINE_STEP_HZ) {
    offsets.push(offsetHz);
  }
  return Float64Array.from(offsets);
}

function readAt(offsetHz: number, sidebands: Sidebands, modulationHz: number): DetectorReadings {
  const size = sidebands.real.length;
  const first = Math.ceil((offsetHz - FILTER_REACH_HZ) / modulationHz);
  const last = Math.floor((offsetHz + FILTER_REACH_HZ) / modulationHz);
  const samples = Math.max(32, powerOfTwo(2 * (last - first + 1)));
  const real = new Float64Array(samples);
  const imaginary = new Float64Array(samples);
  for (let order = first; order <= last; order++) {
    const source = ((order % size) + size) % size;
    const weight = gaussianResponse(order * modulationHz - offsetHz);
    // Moving all orders by the same number turns the envelope's phase only; conjugation turns the transform round.
    real[order - first] = sidebands.real[source] * weight;
    imaginary[order - first] = -sidebands.imaginary[source] * weight;
  }
  fourierTransform(real, imaginary);
  for (let index = 0; index < samples; index++) {
    real[index] = sqrt(real[index] * real[index] + imaginary[index] * imaginary[index]);
  }
  return detectEnvelope(real);
}

function powerOfTwo(atLeast: number): number {
  return 2 ** Math.ceil(Math.log2(Math.max(1, atLeast)));
}
