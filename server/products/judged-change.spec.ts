import { type JudgedBand, judgedChange } from './judged-change';

function band(given: Partial<JudgedBand>): JudgedBand {
  return {
    ...{ stateId: 1, line: 'L', detector: 'QP', band: '0.15-0.5 MHz' },
    ...{ verdict: 'held', differenceDb: 0, worst: 10 },
    ...given,
  };
}

describe('judgedChange', () => {
  it('is that of the lost band with the least margin, however much another lost or gained', () => {
    const bands = [
      band({ band: '0.15-0.5 MHz', verdict: 'lost', differenceDb: -6.5, worst: -2.5 }),
      band({ band: '0.5-5 MHz', verdict: 'lost', differenceDb: -9, worst: 12 }),
      band({ band: '5-30 MHz', verdict: 'gained', differenceDb: 4, worst: -3 }),
    ];
    expect(judgedChange(bands)).toBe(-6.5);
  });

  it('is that of the band with the least margin when none lost', () => {
    const bands = [
      band({ band: '0.15-0.5 MHz', verdict: 'gained', differenceDb: 5, worst: 20 }),
      band({ band: '0.5-5 MHz', differenceDb: 0.3, worst: 2 }),
      band({ band: '5-30 MHz', verdict: 'cannotSay', differenceDb: null, worst: 1 }),
    ];
    expect(judgedChange(bands)).toBe(0.3);
  });

  it('is not that of a PK reading where QP was read too, unless only the PK reading lost', () => {
    const quasiPeak = band({ differenceDb: 0.4, worst: 6 });
    const peak = band({ detector: 'PK', differenceDb: -0.9, worst: 4 });
    expect(judgedChange([peak, quasiPeak])).toBe(0.4);
    expect(judgedChange([peak])).toBe(-0.9);
    expect(judgedChange([{ ...peak, verdict: 'lost' }, quasiPeak])).toBe(-0.9);
    expect(
      judgedChange([
        { ...peak, verdict: 'lost' },
        { ...quasiPeak, verdict: 'lost' },
      ]),
    ).toBe(0.4);
  });

  it('is none when nothing was compared', () => {
    expect(judgedChange([])).toBeNull();
    expect(judgedChange([band({ verdict: 'cannotSay', differenceDb: null })])).toBeNull();
  });
});
