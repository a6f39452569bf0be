import { describeDrop, type DropFacts } from './describe-drop';

const facts = (overrides: Partial<DropFacts> = {}): DropFacts => ({
  build: { hardware: 'C1', firmware: '2.5.0' },
  reference: { hardware: 'C1', firmware: '2.4.1' },
  lossDb: 6.3,
  line: 'L',
  detector: 'QP',
  frequencyHz: 156_020,
  marginDb: 1.42,
  referenceFrequencyHz: 195_000,
  levelChangeDb: 8.2,
  bandFromHz: 150_000,
  bandToHz: 500_000,
  buildSwitching: [{ stage: 'PFC', frequencyHz: 78_000, spreadPercent: 0 }],
  referenceSwitching: [{ stage: 'PFC', frequencyHz: 65_000, spreadPercent: 0 }],
  toleranceHz: 2_250,
  ...overrides,
});
const sameSwitching = {
  frequencyHz: 195_100,
  buildSwitching: [{ stage: 'PFC', frequencyHz: 65_000, spreadPercent: 0 }],
};

describe('describeDrop', () => {
  it('says what moved into the band when the declared switching frequencies explain it', () => {
    expect(describeDrop(facts())).toBe(
      'Firmware 2.5.0 lost 6.3 dB on L at 156 kHz (QP): the 2nd harmonic of the PFC moved from 130 to 156 kHz, into the band. 1.4 dB left to the limit.',
    );
  });

  it('leaves "into the band" out when the harmonic was in it before', () => {
    const text = describeDrop(
      facts({ frequencyHz: 234_000, referenceSwitching: [{ stage: 'PFC', frequencyHz: 65_000, spreadPercent: 0 }] }),
    );
    expect(text).toContain(': the 3rd harmonic of the PFC moved from 195 to 234 kHz. ');
  });

  it('says that a harmonic rose when its switching frequency stayed', () => {
    expect(describeDrop(facts({ ...sameSwitching, levelChangeDb: 4.1, lossDb: 4.1 }))).toBe(
      'Firmware 2.5.0 lost 4.1 dB on L at 195.1 kHz (QP): the 3rd harmonic of the PFC at 195 kHz rose by 4.1 dB. 1.4 dB left to the limit.',
    );
  });

  it('does not give a harmonic the rise of another line', () => {
    expect(describeDrop(facts({ ...sameSwitching, referenceFrequencyHz: 260_000 }))).not.toContain('harmonic');
  });

  it('does not say that a harmonic rose which fell, as on a falling limit', () => {
    const text = describeDrop(facts({ ...sameSwitching, levelChangeDb: -0.5 }));
    expect(text).not.toContain('harmonic');
  });

  it.each([
    ['nothing is declared', { buildSwitching: [] }],
    ['the reference declares nothing', { referenceSwitching: [] }],
    ['the worst point is no harmonic', { frequencyHz: 180_000 }],
    [
      'two stages fit',
      {
        buildSwitching: [
          { stage: 'PFC', frequencyHz: 78_000, spreadPercent: 0 },
          { stage: 'LLC', frequencyHz: 156_000, spreadPercent: 0 },
        ],
      },
    ],
  ])('states no cause when %s', (_, overrides) => {
    expect(describeDrop(facts(overrides))).toMatch(/\(QP\)\. 1\.4 dB left to the limit\.$/);
  });

  it('says how far over the limit it is, and never "0.0 dB left" below it', () => {
    expect(describeDrop(facts({ marginDb: -1.4 }))).toMatch(/ 1\.4 dB over the limit\.$/);
    expect(describeDrop(facts({ marginDb: -0.01 }))).toMatch(/ Just over the limit\.$/);
  });

  it.each([
    [{ hardware: 'D0', firmware: '2.4.1' }, 'Hardware D0 lost'],
    [{ hardware: 'D0', firmware: '2.5.0' }, 'Hardware D0 with firmware 2.5.0 lost'],
    [{ hardware: 'C1', firmware: '2.4.1' }, 'Hardware C1 with firmware 2.4.1 lost'],
  ])('names what changed between reference and build: %j', (build, start) => {
    expect(describeDrop(facts({ build })).startsWith(start)).toBe(true);
  });

  it('writes both units when they differ, and 11th', () => {
    const text = describeDrop(
      facts({
        frequencyHz: 1_012_000,
        bandFromHz: 500_000,
        bandToHz: 5_000_000,
        buildSwitching: [{ stage: 'LLC', frequencyHz: 92_000, spreadPercent: 0 }],
        referenceSwitching: [{ stage: 'LLC', frequencyHz: 90_000, spreadPercent: 0 }],
      }),
    );
    expect(text).toContain('the 11th harmonic of the LLC moved from 990 kHz to 1.01 MHz.');
  });
});
