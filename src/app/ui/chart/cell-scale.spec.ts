import { cellEdgesHz } from '@shared/limits/cells';
import { cellPosition, cellTicks } from './cell-scale';

const EDGES_HZ = [...cellEdgesHz()];

it('places every edge at the number of its cell and a frequency inside by its logarithm', () => {
  EDGES_HZ.slice(0, -1).forEach((edgeHz, cell) => expect(cellPosition(edgeHz, EDGES_HZ)).toBeCloseTo(cell, 9));
  expect(cellPosition(30e6, EDGES_HZ)).toBeCloseTo(EDGES_HZ.length - 1, 9);
  expect(cellPosition(Math.sqrt(EDGES_HZ[4] * EDGES_HZ[5]), EDGES_HZ)).toBeCloseTo(4.5, 9);
});

it('labels the ends and the breaks of the limit', () => {
  expect(cellTicks(EDGES_HZ).map(({ text }) => text)).toEqual(expect.arrayContaining(['150k', '500k', '5M', '30M']));
});
