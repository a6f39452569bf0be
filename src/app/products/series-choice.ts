import type { ProductView } from '@shared/contracts/products';

/** Which series are looked at; what is left out is not filtered, and the worst over all is shown. */
export interface SeriesChoice {
  state?: string;
  line?: string;
  detector?: string;
}

/** What of an address can be asked for: names the product does not have are left out instead of failing the page. */
export function seriesChoice(asked: SeriesChoice, product: ProductView | undefined): SeriesChoice {
  if (!product) return {};
  const state = product.states.find(({ name }) => name === asked.state)?.name;
  const line = product.lines.find((name) => name === asked.line);
  const detector = product.detectors.find((name) => name === asked.detector);
  return { ...(state && { state }), ...(line && { line }), ...(detector && { detector }) };
}

/** The choice in words: "230 V full load, L, QP"; "all states, lines and detectors" for none. */
export function seriesWords({ state, line, detector }: SeriesChoice): string {
  const rest = [!state && 'states', !line && 'lines', !detector && 'detectors'].filter(Boolean) as string[];
  const all =
    rest.length === 0 ? '' : `all ${rest.slice(0, -1).join(', ')}${rest.length > 1 ? ' and ' : ''}${rest.at(-1)}`;
  return [state, line, detector, all].filter(Boolean).join(', ');
}
