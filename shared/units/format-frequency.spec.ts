import { formatFrequency } from './format-frequency';

describe('formatFrequency', () => {
  it.each([
    [50, '50 Hz'],
    [999.6, '1 kHz'],
    [150_000, '150 kHz'],
    [156_200, '156.2 kHz'],
    [999_949, '999.9 kHz'],
    [999_950, '1 MHz'],
    [7_210_000, '7.21 MHz'],
    [30_000_000, '30 MHz'],
  ])('writes %d Hz as %s', (frequencyHz, text) => {
    expect(formatFrequency(frequencyHz)).toBe(text);
  });
});
