import { type DetectorReadings, detectEnvelope } from './detect-envelope';
import { type SwitchingStage, sampleCourse } from './switching-stage';
import { trapezoidHarmonic } from './trapezoid';

/** One harmonic of the switched node: its frequency and what the detectors would read of its voltage. */
export interface StageHarmonic {
  order: number;
  frequencyHz: number;
  /** Peak-amplitude volts, by detector, before any frequency spreading. */
  nodeV: DetectorReadings;
}

/**
 * All harmonics of a stage that lie in a frequency range, with the slow course of duty and swing seen by each detector.
 *
 * For every harmonic the trapezoid amplitude at each moment of the slow cycle is the envelope of that line.
 *
 * @param stage the switching stage
 * @param fromHz lowest frequency in Hz
 * @param toHz highest frequency in Hz
 * @returns harmonics in rising order
 * Source: trapezoid spectrum and detectors as stated there. NOTE: duty sidebands of high orders may spread over more than the
 * receiver's bandwidth; they are taken as inside it.
 * @example a 65 kHz stage from 150 kHz to 30 MHz has the orders 3 to 461
 */
export function stageHarmonics(stage: SwitchingStage, fromHz: number, toHz: number): StageHarmonic[] {
  const points = sampleCourse(stage.course);
  const envelope = new Float64Array(points.length);
  const harmonics: StageHarmonic[] = [];
  const first = Math.max(1, Math.ceil(fromHz / stage.frequencyHz));
  for (let order = first; order * stage.frequencyHz <= toHz; order++) {
    points.forEach((point, index) => {
      const wave = {
        amplitude: stage.swingV * point.amplitude,
        duty: point.duty,
        riseFraction: stage.riseTimeS * stage.frequencyHz,
        fallFraction: stage.fallTimeS * stage.frequencyHz,
      };
      envelope[index] = trapezoidHarmonic(wave, order);
    });
    harmonics.push({ order, frequencyHz: order * stage.frequencyHz, nodeV: detectEnvelope(envelope) });
  }
  return harmonics;
}
