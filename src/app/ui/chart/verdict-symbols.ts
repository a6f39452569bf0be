import { mdiArrowDownBold, mdiArrowUpBold, mdiFlag, mdiHelp, mdiStarOutline } from '@mdi/js';
import type { ChartPalette } from './chart-palette';

const SYMBOLS = {
  lost: { path: mdiArrowDownBold, colour: 'lost' },
  gained: { path: mdiArrowUpBold, colour: 'gained' },
  cannotSay: { path: mdiHelp, colour: 'unsure' },
  reference: { path: mdiStarOutline, colour: 'ink' },
  drop: { path: mdiFlag, colour: 'lost' },
} as const;

/** The glyph of the verdict chip, as a symbol in a chart. */
export function verdictSymbol(name: keyof typeof SYMBOLS, palette: ChartPalette) {
  const { path, colour } = SYMBOLS[name];
  return { symbol: `path://${path}`, symbolKeepAspect: true, itemStyle: { color: palette[colour] } };
}
