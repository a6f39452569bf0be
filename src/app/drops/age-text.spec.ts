import { ageText } from './age-text';

const NOW = Date.parse('2026-12-01T12:00:00Z');

it.each([
  ['2026-12-01T11:59:30Z', 'now'],
  ['2026-12-01T11:55:00Z', '5 min'],
  ['2026-12-01T08:30:00Z', '3 h'],
  ['2026-11-29T10:35:00Z', '2 d'],
  ['2026-10-06T12:00:00Z', '8 wk'],
  ['2026-12-01T12:00:20Z', 'now'],
])('says how long ago %s was: %s', (at, words) => {
  expect(ageText(at, NOW)).toBe(words);
});
