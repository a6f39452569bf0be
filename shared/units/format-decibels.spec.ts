import { formatDecibels, formatSignedDecibels } from './format-decibels';

describe('decibels for people', () => {
  it.each([
    [3.24, '3.2 dB'],
    [-3.26, '-3.3 dB'],
    [-0.04, '0.0 dB'],
    [12, '12.0 dB'],
  ])('writes %d as %s', (levelDb, text) => {
    expect(formatDecibels(levelDb)).toBe(text);
  });

  it.each([
    [3.24, '+3.2 dB'],
    [-3.24, '-3.2 dB'],
    [0.01, '0.0 dB'],
    [-0.01, '0.0 dB'],
  ])('writes the change %d as %s', (changeDb, text) => {
    expect(formatSignedDecibels(changeDb)).toBe(text);
  });
});
