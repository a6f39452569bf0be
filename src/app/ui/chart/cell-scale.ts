import { tickLabel } from './frequency-scale';

const TICKS_HZ = [150e3, 200e3, 300e3, 500e3, 1e6, 2e6, 3e6, 5e6, 10e6, 20e6, 30e6];

/** Where a frequency lies among the cells: the number of its cell plus the share of that cell on a log scale. */
export function cellPosition(frequencyHz: number, edgesHz: readonly number[]): number {
  const last = edgesHz.length - 2;
  let cell = 0;
  while (cell < last && edgesHz[cell + 1] <= frequencyHz) cell++;
  return cell + Math.log(frequencyHz / edgesHz[cell]) / Math.log(edgesHz[cell + 1] / edgesHz[cell]);
}

/** The trade's frequencies as places on the axis of cells, with their text. */
export function cellTicks(edgesHz: readonly number[]): { at: number; text: string }[] {
  return TICKS_HZ.filter((tickHz) => tickHz >= edgesHz[0] && tickHz <= edgesHz[edgesHz.length - 1]).map((tickHz) => ({
    at: cellPosition(tickHz, edgesHz),
    text: tickLabel(tickHz),
  }));
}
