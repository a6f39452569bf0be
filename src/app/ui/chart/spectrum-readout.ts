import { formatDecibels } from '@shared/units/format-decibels';
import type { Readout } from './chart-readout';
import { limitTexts } from './limit-table';
import type { SpectrumReading } from './spectrum-reading';
import type { SpectrumLimit, SpectrumTrace } from './spectrum-types';

type ReadoutTable = Pick<Readout, 'columns' | 'rows'>;

/** What the cursor reads from traces: level, limit and margin of each. */
export function traceRows(
  readings: readonly SpectrumReading[],
  colourOf: (trace: SpectrumTrace) => string,
): ReadoutTable {
  return {
    columns: ['level dBµV', 'limit', 'margin'],
    rows: readings.map(({ trace, levelDbuv, limitDbuv, marginDb }) => ({
      colour: colourOf(trace),
      label: trace.label,
      cells: [levelDbuv.toFixed(1), limitDbuv?.toFixed(1) ?? '', marginDb === null ? '' : formatDecibels(marginDb)],
      isOver: marginDb !== null && marginDb < 0,
    })),
  };
}

/** What the cursor reads from limit lines alone. */
export function limitRows(limits: readonly SpectrumLimit[], frequencyHz: number): ReadoutTable {
  const texts = limitTexts(limits, frequencyHz);
  return { columns: ['limit dBµV'], rows: limits.map(({ name }, i) => ({ label: name, cells: [texts[i]] })) };
}
