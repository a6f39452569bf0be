import { detectEnvelope } from './detect-envelope';
import { type FrequencyRaster, type LineSpectra, emptySpectra } from './emission-spectrum';
import { FILTER_REACH_HZ, gaussianResponse } from './receiver-filter';

/** An AM broadcast transmitter picked up by the mains leads. */
export interface AmbientCarrier {
  frequencyHz: number;
  levelDbuv: number;
}

/** Depth of the programme modulation; a common mean value, no source. */
const MODULATION_DEPTH = 0.5;
const AM_ENVELOPE = Float64Array.from(
  { length: 64 },
  (_, i) => 1 + MODULATION_DEPTH * Math.sin((2 * Math.PI * i) / 64),
);
const AM_READINGS = detectEnvelope(AM_ENVELOPE);

/**
 * What a receiver reads of AM broadcast carriers; their audio sidebands lie inside the 9 kHz filter.
 *
 * @param carriers carrier frequency in Hz and average level in dBuV, each
 * @param raster tuned frequencies in Hz
 * @returns rms microvolts by detector: average the carrier, peak 3.5 dB above it at 50 % modulation
 * Source: envelope of amplitude modulation, 1 + m sin; carrier raster of 9 kHz by ITU regions 1 and 3.
 * @example a carrier of 20 dBuV at 693 kHz reads AV 20.0 and PK 23.5 dBuV when tuned to it
 */
export function ambientSpectra(carriers: AmbientCarrier[], raster: FrequencyRaster): LineSpectra {
  const spectra = emptySpectra(raster);
  for (const carrier of carriers) {
    const amplitude = 10 ** (carrier.levelDbuv / 20);
    const first = Math.max(0, Math.ceil((carrier.frequencyHz - FILTER_REACH_HZ - raster.startHz) / raster.stepHz));
    const last = Math.min(raster.pointCount - 1, first + Math.floor((2 * FILTER_REACH_HZ) / raster.stepHz));
    for (let point = first; point <= last; point++) {
      const weight = amplitude * gaussianResponse(raster.startHz + raster.stepHz * point - carrier.frequencyHz);
      spectra.PK[point] = Math.hypot(spectra.PK[point], weight * AM_READINGS.peak);
      spectra.QP[point] = Math.hypot(spectra.QP[point], weight * AM_READINGS.quasiPeak);
      spectra.AV[point] = Math.hypot(spectra.AV[point], weight * AM_READINGS.average);
    }
  }
  return spectra;
}
