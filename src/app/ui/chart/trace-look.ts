import type { ChartPalette } from './chart-palette';
import type { SpectrumTrace } from './spectrum-types';

export interface TraceLook {
  colour: string;
  /** Lines wider than 1 px cost several times as much to draw without a graphics card, so only one trace is. */
  widthPx: number;
  /** Dash of the detector: PK solid, QP long dash, AV dotted. */
  dash: number[] | 'solid';
  /** Marker of the conductor. */
  symbol: 'circle' | 'triangle' | 'rect' | 'diamond' | 'roundRect';
}

const DASHES = { PK: 'solid', QP: [14, 4], AV: [2, 3] } as const;
const SYMBOLS: Record<string, TraceLook['symbol']> = {
  L: 'circle',
  N: 'triangle',
  L1: 'circle',
  L2: 'triangle',
  L3: 'rect',
  '+': 'diamond',
  '-': 'roundRect',
};

/** How each trace is drawn, in the order given; colour tells builds apart, dash the detector, marker the conductor. */
export function traceLooks(traces: readonly SpectrumTrace[], palette: ChartPalette): TraceLook[] {
  let others = 0;
  return traces.map(({ role, detector, line }) => {
    const colour =
      role === 'build'
        ? palette.accent
        : role === 'reference'
          ? palette.reference
          : role === 'background'
            ? palette.background
            : palette.traces[others++ % palette.traces.length];
    return {
      colour,
      widthPx: role === 'build' ? 1.6 : 1,
      dash: DASHES[detector] === 'solid' ? 'solid' : [...DASHES[detector]],
      symbol: SYMBOLS[line] ?? 'circle',
    };
  });
}
