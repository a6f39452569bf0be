import type { ChartPalette } from './chart-palette';
import type { FrequencyRange } from './frequency-scale';
import type { SpectrumLimit, SpectrumMark, SpectrumTrace } from './spectrum-types';
import type { TraceLook } from './trace-look';

/** All that one drawing of a spectrum depends on. */
export interface SpectrumScene {
  traces: readonly SpectrumTrace[];
  looks: readonly TraceLook[];
  limits: readonly SpectrumLimit[];
  marks: readonly SpectrumMark[];
  pinsHz: readonly number[];
  range: FrequencyRange;
  levels: { fromDbuv: number; toDbuv: number };
  /** Width of the plot, px; each trace keeps its highest and lowest point of every column. */
  columns: number;
  palette: ChartPalette;
}
