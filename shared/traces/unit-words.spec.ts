import { frequencyUnitIn, isUnitOnly, levelUnitIn, withoutUnit } from './unit-words';

describe('units in headings', () => {
  it.each([
    ['Frequency [MHz]', 'MHz'],
    ['f/kHz', 'kHz'],
    ['Freq. in Hz', 'Hz'],
    ['GHZ', 'GHz'],
    ['Frequency', undefined],
    ['Hertzian', undefined],
  ])('%s states %s', (text, unit) => {
    expect(frequencyUnitIn(text)).toBe(unit);
  });

  it.each([
    ['Level [dBuV]', 'dBuV'],
    ['Level (dB\u00b5V)', 'dBuV'],
    ['Level dB(\u03bcV)', 'dBuV'],
    ['QP in dB\u00b5V', 'dBuV'],
    ['[dBm]', 'dBm'],
    ['dB(mW)', 'dBm'],
    ['dBmV', 'dBmV'],
    ['Margin dB', 'dB'],
    ['E [dBuV/m]', { other: 'dBuV/m' }],
    ['I [dBuA]', { other: 'dBuA' }],
    ['U [mV]', { other: 'mV' }],
    ['uV', { other: 'uV' }],
    ['Level', undefined],
    ['Adblock', undefined],
  ])('%s states %j', (text, unit) => {
    expect(levelUnitIn(text)).toEqual(unit);
  });

  it.each([
    ['QP [dBuV]', 'QP'],
    ['Level dB(\u00b5V)', 'Level'],
    ['Frequency / MHz', 'Frequency'],
    ['Quasi-Peak L1 (dBm)', 'Quasi-Peak L1'],
    ['dBuV', ''],
  ])('%s is named %j without its unit', (text, name) => {
    expect(withoutUnit(text)).toBe(name);
  });

  it('knows a cell that is a unit and nothing else', () => {
    expect(['Hz', '[MHz]', 'dB\u00b5V', '(dBm)'].every(isUnitOnly)).toBe(true);
    expect(['', 'Level', 'QP [dBuV]', 'L'].some(isUnitOnly)).toBe(false);
  });
});
