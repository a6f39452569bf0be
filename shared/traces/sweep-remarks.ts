import { RECEIVER_BAND_B } from '../detectors/receiver-bands';
import { formatDecibels } from '../units/format-decibels';
import { formatFrequency } from '../units/format-frequency';
import type { GridDescription } from './frequency-grid';
import type { BandMargin } from './margins';

/** Something the reader of a sweep should know; it never stops an import. */
export interface SweepRemark {
  readonly code: string;
  readonly text: string;
}

export interface SettingsOfSweep {
  readonly rbwHz: number | null;
  readonly grid: GridDescription;
}

/** From here down to the limit a floor hides what it should show. CISPR 16-2-1: ambient at least 6 dB below the limit. */
const FLOOR_DISTANCE_DB = 6;
/** A share that rounds to 100 %. */
const WHOLE_BAND = 0.995;

/**
 * Loss of level of a line midway between two points.
 * Formula: 24.0824 * (step / 2 / B6)^2 dB.
 * @param stepHz step between points in Hz
 * @param bandwidthHz 6 dB bandwidth in Hz, above 0
 * @returns loss in dB, 0 or more
 * Source: Gaussian filter with the 6 dB bandwidth B6: 40 log10(2) / B6^2 * 2 per Hz^2 (calculated, CISPR 16-1-1 bandwidths).
 * Example: 4.5 kHz steps with 9 kHz lose up to 1.51 dB, 9 kHz steps 6.02 dB.
 */
export function scallopingLossDb(stepHz: number, bandwidthHz: number): number {
  return 80 * Math.log10(2) * (stepHz / 2 / bandwidthHz) ** 2;
}

/** Remarks on resolution bandwidth and step of a sweep of 150 kHz to 30 MHz. */
export function remarksOnSettings({ rbwHz, grid }: SettingsOfSweep): SweepRemark[] {
  const remarks: SweepRemark[] = [];
  const { lowestBandwidthHz, highestBandwidthHz, bandwidthHz } = RECEIVER_BAND_B;
  if (rbwHz === null) {
    remarks.push({
      code: 'bandwidthUnknown',
      text: 'neither file nor tags state the resolution bandwidth; it must be known before builds can be compared',
    });
  } else if (rbwHz < lowestBandwidthHz || rbwHz > highestBandwidthHz) {
    remarks.push({
      code: 'bandwidth',
      text: `resolution bandwidth ${formatFrequency(rbwHz)} instead of 9 kHz (8 to 10 kHz): levels are not those the limits are written for`,
    });
  }
  const filterHz = rbwHz ?? bandwidthHz;
  if (grid.medianStepHz > filterHz / 2) {
    const lossDb = scallopingLossDb(grid.medianStepHz, filterHz);
    remarks.push({
      code: 'coarseStep',
      text: `step ${formatFrequency(grid.medianStepHz)} is more than half the bandwidth of ${formatFrequency(filterHz)}: a line between two points reads up to ${formatDecibels(lossDb)} low`,
    });
  }
  return remarks;
}

/** Remarks on what a sweep covers and how far its floor lies below the limit, band by band. */
export function remarksOnBands(bands: readonly BandMargin[]): SweepRemark[] {
  return bands.flatMap((band) => {
    const remarks: SweepRemark[] = [];
    if (band.worst === null) {
      remarks.push({ code: 'notCovered', text: `${band.band}: not measured` });
    } else if (band.coveredFraction < WHOLE_BAND) {
      const percent = Math.floor(band.coveredFraction * 100);
      remarks.push({ code: 'partlyCovered', text: `${band.band}: only ${percent} % of the band is measured` });
    }
    if (band.floorMarginDb !== null && band.floorMarginDb < FLOOR_DISTANCE_DB) {
      const place =
        band.floorMarginDb < 0
          ? `${formatDecibels(-band.floorMarginDb)} above`
          : `only ${formatDecibels(band.floorMarginDb)} below`;
      remarks.push({ code: 'floorNearLimit', text: `${band.band}: the floor of the trace lies ${place} the limit` });
    }
    return remarks;
  });
}

const BAND_CODES = new Set(['notCovered', 'partlyCovered', 'floorNearLimit']);

/** Remarks of a sweep whose bands were measured anew: those on the bands are replaced, all others stay. */
export function refreshBandRemarks(remarks: readonly SweepRemark[], bands: readonly BandMargin[]): SweepRemark[] {
  return [...remarks.filter(({ code }) => !BAND_CODES.has(code)), ...remarksOnBands(bands)];
}
