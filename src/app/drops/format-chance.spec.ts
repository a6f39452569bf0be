import { formatChance } from './format-chance';

it.each([
  [2.5e-14, 'below 0.0001'],
  [0.0001, '0.0001'],
  [0.00387, '0.004'],
  [0.0452, '0.05'],
])('writes %d as %s', (chance, words) => {
  expect(formatChance(chance)).toBe(words);
});
