import type { Detector } from '../detectors/detectors';
import { lineTransfers, modeTransfers } from './conducted-path';
import type { InputFilter } from './filter-elements';
import type { LisnNetwork } from './lisn-impedance';
import { FILTER_REACH_HZ, gaussianResponse } from './receiver-filter';
import type { SpreadShape } from './spread-line';
import type { SpreadShapes } from './spread-shapes';
import { stageHarmonics } from './stage-harmonics';
import type { SwitchingStage } from './switching-stage';

// NOTE: taken once: looking Math up in every turn of these loops is ten times slower in a test runner's sandbox.
const { abs, max, min, sqrt } = Math;

/** Equally spaced tuned frequencies. */
export interface FrequencyRaster {
  startHz: number;
  stepHz: number;
  pointCount: number;
}

/** A converter in one operating point, on one LISN. */
export interface EmissionCondition {
  stages: SwitchingStage[];
  filter: InputFilter;
  lisn: LisnNetwork;
}

/** Rms microvolts at every tuned frequency, by detector. */
export type LineSpectra = Record<Detector, Float64Array>;

/** What a noiseless receiver reads on both lines; the same for every run of the condition. */
export type EmissionSpectrum = Record<'L' | 'N', LineSpectra>;

const PEAK_VOLTS_TO_RMS_MICROVOLTS = 1e6 / Math.SQRT2;

/**
 * What a noiseless CISPR receiver reads of a converter on line and neutral.
 *
 * Every harmonic goes through its path to both lines (V_L = CM + DM, V_N = CM - DM) and is laid over the tuned frequencies as the
 * filter's skirt, or as the plateau of its spreading. Different lines in one bandwidth add as powers; plateaus of neighbouring
 * harmonics pass one after the other, so their peaks do not add and their averages do.
 *
 * @param condition stages, filter and LISN
 * @param raster tuned frequencies in Hz
 * @param shapes keeper of spread shapes, shared between calls
 * @returns rms microvolts by line and detector, one value a tuned frequency; peak >= quasi-peak >= average
 * Source: see the functions used; the additions are our own approximation, exact for resolved lines.
 * @example a single 200 kHz line of 1 V peak at the LISN reads 117 dBuV with each detector at 200 kHz
 */
export function emissionSpectrum(
  condition: EmissionCondition,
  raster: FrequencyRaster,
  shapes: SpreadShapes,
): EmissionSpectrum {
  const total: EmissionSpectrum = { L: emptySpectra(raster), N: emptySpectra(raster) };
  for (const stage of condition.stages) {
    const own = stageSpectrum(stage, condition, raster, shapes);
    addPowers(total.L, own.L);
    addPowers(total.N, own.N);
  }
  return total;
}

/** Arrays of zeros: the spectrum of a device that is off. */
export function emptySpectra(raster: FrequencyRaster): LineSpectra {
  const zeros = (): Float64Array => new Float64Array(raster.pointCount);
  return { PK: zeros(), QP: zeros(), AV: zeros() };
}

function stageSpectrum(
  stage: SwitchingStage,
  condition: EmissionCondition,
  raster: FrequencyRaster,
  shapes: SpreadShapes,
): EmissionSpectrum {
  const spectrum: EmissionSpectrum = { L: emptySpectra(raster), N: emptySpectra(raster) };
  const endHz = raster.startHz + raster.stepHz * (raster.pointCount - 1);
  const excursionRatio = (stage.spreading?.peakToPeakPercent ?? 0) / 100;
  const fromHz = (raster.startHz - FILTER_REACH_HZ) / (1 + excursionRatio / 2);
  const toHz = (endHz + FILTER_REACH_HZ) / (1 - excursionRatio / 2);
  for (const harmonic of stageHarmonics(stage, fromHz, toHz)) {
    const modes = modeTransfers(stage, condition.filter, condition.lisn, harmonic.frequencyHz);
    const { lineL, lineN } = lineTransfers(modes);
    const excursionHz = excursionRatio * harmonic.frequencyHz;
    const shape = stage.spreading === null ? null : shapes(excursionHz, stage.spreading);
    const reachHz = FILTER_REACH_HZ + (shape === null ? 0 : excursionHz / 2);
    const first = max(0, Math.ceil((harmonic.frequencyHz - reachHz - raster.startHz) / raster.stepHz));
    const last = min(
      raster.pointCount - 1,
      Math.floor((harmonic.frequencyHz + reachHz - raster.startHz) / raster.stepHz),
    );
    for (let point = first; point <= last; point++) {
      const offsetHz = abs(raster.startHz + raster.stepHz * point - harmonic.frequencyHz);
      const { peak, quasiPeak, average } = harmonic.nodeV;
      if (shape === null) {
        const weight = gaussianResponse(offsetHz) * PEAK_VOLTS_TO_RMS_MICROVOLTS;
        addLine(spectrum.L, point, peak * weight * lineL, quasiPeak * weight * lineL, average * weight * lineL);
        addLine(spectrum.N, point, peak * weight * lineN, quasiPeak * weight * lineN, average * weight * lineN);
      } else {
        const weights = weightsAt(shape, excursionHz, offsetHz);
        const pk = peak * weights.peak * PEAK_VOLTS_TO_RMS_MICROVOLTS;
        const qp = quasiPeak * weights.quasiPeak * PEAK_VOLTS_TO_RMS_MICROVOLTS;
        const av = average * weights.average * PEAK_VOLTS_TO_RMS_MICROVOLTS;
        addPlateau(spectrum.L, point, pk * lineL, qp * lineL, av * lineL);
        addPlateau(spectrum.N, point, pk * lineN, qp * lineN, av * lineN);
      }
    }
  }
  return spectrum;
}

/** Readings of a shape at a distance from its centre; the kept shape is stretched to the excursion asked for. */
function weightsAt(shape: SpreadShape, excursionHz: number, offsetHz: number): SpreadShape['readings'][number] {
  const edgeHz = excursionHz / 2;
  const position =
    offsetHz <= edgeHz ? (offsetHz * shape.excursionHz) / excursionHz : offsetHz - edgeHz + shape.excursionHz / 2;
  const { offsetsHz, readings } = shape;
  let below = 0;
  let above = offsetsHz.length - 1;
  while (above - below > 1) {
    const middle = (below + above) >> 1;
    if (offsetsHz[middle] <= position) below = middle;
    else above = middle;
  }
  const part = min(1, (position - offsetsHz[below]) / (offsetsHz[above] - offsetsHz[below]));
  const mix = (low: number, high: number): number => low + part * (high - low);
  return {
    peak: mix(readings[below].peak, readings[above].peak),
    quasiPeak: mix(readings[below].quasiPeak, readings[above].quasiPeak),
    average: mix(readings[below].average, readings[above].average),
  };
}

function addLine(spectra: LineSpectra, point: number, peak: number, quasiPeak: number, average: number): void {
  spectra.PK[point] = rootOfSquares(spectra.PK[point], peak);
  spectra.QP[point] = rootOfSquares(spectra.QP[point], quasiPeak);
  spectra.AV[point] = rootOfSquares(spectra.AV[point], average);
}

function addPlateau(spectra: LineSpectra, point: number, peak: number, quasiPeak: number, average: number): void {
  spectra.PK[point] = max(spectra.PK[point], peak);
  spectra.QP[point] = min(spectra.PK[point], rootOfSquares(spectra.QP[point], quasiPeak));
  spectra.AV[point] = min(spectra.QP[point], spectra.AV[point] + average);
}

function addPowers(total: LineSpectra, own: LineSpectra): void {
  for (let point = 0; point < total.PK.length; point++) {
    addLine(total, point, own.PK[point], own.QP[point], own.AV[point]);
  }
}

function rootOfSquares(a: number, b: number): number {
  return sqrt(a * a + b * b);
}
