import { limitAt } from '@shared/limits/limit-line';
import { formatFrequency } from '@shared/units/format-frequency';
import type { ChartTable } from './chart-table';
import { FrequencyRange, frequencyTicksHz, rangeText } from './frequency-scale';
import type { SpectrumLimit } from './spectrum-types';

/** The limit of every line at a frequency, as text. */
export function limitTexts(limits: readonly SpectrumLimit[], frequencyHz: number): string[] {
  return limits.map(({ line }) => limitAt(line, frequencyHz)?.toFixed(1) ?? 'no limit');
}

/** The limits at the ticks of the axis, at every break of a line and at the ends of the view. */
export function limitTable(limits: readonly SpectrumLimit[], view: FrequencyRange): ChartTable {
  const breaksHz = limits.flatMap(({ line }) => line.segments.flatMap(({ fromHz, toHz }) => [fromHz, toHz]));
  const placesHz = new Set([view.fromHz, ...frequencyTicksHz(view), ...breaksHz, view.toHz]);
  return {
    caption: `Limits in dBµV from ${rangeText(view)}; where two segments meet, the lower limit applies`,
    columns: [{ label: 'dBµV at', isNumber: true }, ...limits.map(({ name }) => ({ label: name, isNumber: true }))],
    rows: [...placesHz]
      .filter((placeHz) => placeHz >= view.fromHz && placeHz <= view.toHz)
      .sort((a, b) => a - b)
      .map((placeHz) => [formatFrequency(placeHz), ...limitTexts(limits, placeHz)]),
  };
}

/** Every corner of every line, whatever the view shows: straight over log f between them, they are all there is. */
export function* limitCsvRows(limits: readonly SpectrumLimit[]): Generator<(string | number)[]> {
  yield ['limit', 'detector', 'frequencyHz', 'limitDbuv'];
  for (const { name, line } of limits) {
    for (const { fromHz, toHz, fromDbuv, toDbuv } of line.segments) {
      yield [name, line.detector, fromHz, fromDbuv];
      yield [name, line.detector, toHz, toDbuv];
    }
  }
}
