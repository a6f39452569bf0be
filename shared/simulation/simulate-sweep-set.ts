import { DETECTORS, type Detector } from '../detectors/detectors';
import type { EmissionSpectrum, FrequencyRaster, LineSpectra } from './emission-spectrum';
import { drawLevelCurve } from './level-curve';
import type { RandomGenerator } from './random-generator';
import { type NoiseDraws, type ReceiverChain, noiseDraws, noiseRmsMicrovolts } from './receiver-noise';

// NOTE: taken once: looking Math up in every turn of these loops is ten times slower in a test runner's sandbox.
const { log10, round } = Math;

/** What the runs of one set-up have in common. */
export interface MeasuringSession {
  chain: ReceiverChain;
  noise: NoiseDraws;
  /** Pick-up with the device off, rms microvolts. */
  ambient: LineSpectra;
  /** Level error of this set-up in dB, one value a tuned frequency. */
  shiftDb: Float32Array;
}

/** Corrected levels in dBuV, rounded to 0.01 dB, by line and detector. */
export type SweepSet = Record<'L' | 'N', Record<Detector, Float32Array>>;

/** Level error of a set-up made anew: 0.5 dB in all, most of it common to all frequencies. */
const SESSION_SPREAD = { offsetDb: 0.45, knotDb: 0.2, knots: 5 };
/** Level error of a single run on one line: 0.3 dB in all. */
const RUN_SPREAD = { offsetDb: 0.25, knotDb: 0.2, knots: 12 };
/** Width of an even spread of unit standard deviation. */
const EVEN_SPREAD = Math.sqrt(12);
/** Scatter of the receiver from one tuned frequency to the next. */
const READING_SPREAD_DB = 0.04;

/**
 * Draws what one set-up of the bench has in common for all its runs.
 *
 * @param chain the receiver and its pad, as set and as entered
 * @param ambient pick-up with the device off, rms microvolts
 * @param raster tuned frequencies in Hz
 * @param random the stream of the session
 * @returns the session, with a level error of 0.5 dB standard deviation
 */
export function drawSession(
  chain: ReceiverChain,
  ambient: LineSpectra,
  raster: FrequencyRaster,
  random: RandomGenerator,
): MeasuringSession {
  return {
    chain,
    noise: noiseDraws(chain.dwellS),
    ambient,
    shiftDb: drawLevelCurve(SESSION_SPREAD, raster, random),
  };
}

/**
 * One run: what the receiver writes for line and neutral with all three detectors at once.
 *
 * Level = 10 lg((signal * error * pad error)^2 + ambient^2 + noise^2) with the run's own error, then the receiver's scatter.
 *
 * @param spectrum noiseless readings of the device, rms microvolts (zeros for a background sweep)
 * @param session what this set-up has in common
 * @param raster tuned frequencies in Hz
 * @param random the stream of the run
 * @returns levels in dBuV, steps of 0.01 dB
 * Source: our own model of a run; detectors and noise as stated in their files.
 * @example the same spectrum, session and seed give the same levels bit for bit
 */
export function simulateSweepSet(
  spectrum: EmissionSpectrum,
  session: MeasuringSession,
  raster: FrequencyRaster,
  random: RandomGenerator,
): SweepSet {
  return { L: simulateLine(spectrum.L), N: simulateLine(spectrum.N) };

  function simulateLine(signal: LineSpectra): Record<Detector, Float32Array> {
    const runDb = drawLevelCurve(RUN_SPREAD, raster, random);
    const padError = 10 ** ((session.chain.enteredPadDb - session.chain.padDb) / 20);
    const gain = Float64Array.from(runDb, (db, point) => padError * 10 ** ((db + session.shiftDb[point]) / 20));
    const noiseUv = noiseRmsMicrovolts(session.chain);
    const levels = DETECTORS.map((detector) => {
      const draw = session.noise[detector];
      const readings = new Float32Array(raster.pointCount);
      for (let point = 0; point < raster.pointCount; point++) {
        const device = signal[detector][point] * gain[point];
        const pickUp = session.ambient[detector][point] * padError;
        const noise = noiseUv * draw(random);
        const levelDbuv = 10 * log10(device * device + pickUp * pickUp + noise * noise);
        readings[point] = round((levelDbuv + READING_SPREAD_DB * scatter(random)) * 100) / 100;
      }
      return [detector, readings] as const;
    });
    return Object.fromEntries(levels) as Record<Detector, Float32Array>;
  }
}

/** A cheap deviate of mean 0 and unit standard deviation, evenly spread. */
function scatter(random: RandomGenerator): number {
  return (random.next() - 0.5) * EVEN_SPREAD;
}
