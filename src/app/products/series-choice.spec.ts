import type { ProductView } from '@shared/contracts/products';
import { seriesChoice, seriesWords } from './series-choice';

const product = {
  states: [{ name: '230 V full load' }, { name: '230 V trickle' }],
  lines: ['L', 'N'],
  detectors: ['QP', 'AV'],
} as ProductView;

describe('the choice of series in an address', () => {
  it('keeps what the product has and leaves out what it has not', () => {
    expect(seriesChoice({ state: '230 V trickle', line: 'L3', detector: 'QP' }, product)).toEqual({
      state: '230 V trickle',
      detector: 'QP',
    });
  });

  it('chooses nothing before the product is known', () => {
    expect(seriesChoice({ line: 'L' }, undefined)).toEqual({});
  });

  it.each([
    [{}, 'all states, lines and detectors'],
    [{ line: 'L' }, 'L, all states and detectors'],
    [{ line: 'L', detector: 'QP' }, 'L, QP, all states'],
    [{ state: '230 V trickle', line: 'L', detector: 'QP' }, '230 V trickle, L, QP'],
  ])('says %j as "%s"', (choice, words) => {
    expect(seriesWords(choice)).toBe(words);
  });
});
