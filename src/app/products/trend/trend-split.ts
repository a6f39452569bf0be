import { DETECTORS } from '@shared/detectors/detectors';
import type { ProductView } from '@shared/contracts/products';
import { type SeriesChoice, seriesWords } from '../series-choice';

/** What a trend may draw one line for each of. */
export const TREND_SPLITS = ['band', 'state', 'line', 'detector'] as const;
export type TrendSplit = (typeof TREND_SPLITS)[number];

/** Lines a picture holds: the accent and the set of eight. */
const MOST_LINES = 9;

/** One line of the trend and what to ask for it. */
export interface TrendAsk {
  label: string;
  query: SeriesChoice & { band?: string };
}

export function trendSplit(text: string | undefined): TrendSplit | null {
  return TREND_SPLITS.find((split) => split === text) ?? null;
}

/** The lines of a trend: one for the choice as it stands, or one for each band, state, line or detector within it. */
export function trendAsks(
  split: TrendSplit | null,
  choice: SeriesChoice,
  band: string | undefined,
  product: ProductView,
  bands: readonly string[],
): TrendAsk[] {
  const query = { ...choice, ...(band && { band }) };
  if (split === null) return [{ label: [band, seriesWords(choice)].filter(Boolean).join(', '), query }];
  const values = {
    band: bands,
    state: product.states.map(({ name }) => name),
    line: product.lines,
    detector: DETECTORS.filter((detector) => product.detectors.includes(detector)),
  }[split];
  return values.slice(0, MOST_LINES).map((value) => ({ label: value, query: { ...query, [split]: value } }));
}
