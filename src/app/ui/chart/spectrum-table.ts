import { limitAt } from '@shared/limits/limit-line';
import { firstIndexAbove, firstIndexAtOrAbove } from '@shared/traces/frequency-grid';
import { formatDecibels } from '@shared/units/format-decibels';
import { formatFrequency } from '@shared/units/format-frequency';
import type { ChartTable } from './chart-table';
import { FrequencyRange, frequencyAt, rangeText } from './frequency-scale';
import { limitFor, readTrace } from './spectrum-reading';
import type { SpectrumLimit, SpectrumTrace } from './spectrum-types';

const STRETCHES = 24;

/** The highest point of each trace in 24 equal stretches of the view; the download holds every point. */
export function spectrumTable(
  traces: readonly SpectrumTrace[],
  limits: readonly SpectrumLimit[],
  view: FrequencyRange,
): ChartTable {
  const rows: string[][] = [];
  for (let stretch = 0; stretch < STRETCHES; stretch++) {
    const range = {
      fromHz: frequencyAt(stretch / STRETCHES, view),
      toHz: frequencyAt((stretch + 1) / STRETCHES, view),
    };
    for (const trace of traces) {
      const reading = readTrace(trace, range.fromHz, range.toHz, limits);
      if (!reading) continue;
      rows.push([
        rangeText(range),
        trace.label,
        formatFrequency(reading.frequencyHz),
        reading.levelDbuv.toFixed(1),
        reading.limitDbuv?.toFixed(1) ?? 'none',
        reading.marginDb === null ? '' : formatDecibels(reading.marginDb),
      ]);
    }
  }
  return {
    caption: `Highest point of each sweep in ${STRETCHES} stretches from ${rangeText(view)}`,
    columns: [
      { label: 'Stretch' },
      { label: 'Sweep' },
      { label: 'Frequency', isNumber: true },
      { label: 'Level, dBµV', isNumber: true },
      { label: 'Limit, dBµV', isNumber: true },
      { label: 'Margin', isNumber: true },
    ],
    rows,
  };
}

/** Every measured point in view, one row each: the numbers as they are stored, unrounded margins. */
export function* spectrumCsvRows(
  traces: readonly SpectrumTrace[],
  limits: readonly SpectrumLimit[],
  view: FrequencyRange,
): Generator<(string | number | null)[]> {
  yield ['sweep', 'line', 'detector', 'frequencyHz', 'levelDbuv', 'limitDbuv', 'marginDb'];
  for (const trace of traces) {
    const limit = limitFor(trace, limits);
    const end = firstIndexAbove(trace.frequenciesHz, view.toHz);
    for (let index = firstIndexAtOrAbove(trace.frequenciesHz, view.fromHz); index < end; index++) {
      const frequencyHz = trace.frequenciesHz[index];
      // Stored levels are single precision; six digits give back what was measured.
      const levelDbuv = Number(trace.levelsDbuv[index].toPrecision(6));
      const limitDbuv = limit && limitAt(limit, frequencyHz);
      const marginDb = limitDbuv === null ? null : Number((limitDbuv - levelDbuv).toFixed(4));
      yield [trace.label, trace.line, trace.detector, frequencyHz, levelDbuv, limitDbuv, marginDb];
    }
  }
}
