import { parseFrequency } from './parse-frequency';

describe('parseFrequency', () => {
  it.each([
    ['156 kHz', 156_000],
    ['0.5 MHz', 500_000],
    ['7,21 M', 7_210_000],
    ['5M', 5_000_000],
    ['.15mhz', 150_000],
    ['300000', 300_000],
    ['150 k', 150_000],
    ['9000 Hz', 9000],
  ])('reads %s', (text, frequencyHz) => {
    expect(parseFrequency(text)).toBe(frequencyHz);
  });

  it.each(['', 'kHz', '12 dB', '-3 MHz', '0', '1.2.3 MHz', '5 MM'])('refuses "%s"', (text) => {
    expect(parseFrequency(text)).toBeNull();
  });
});
