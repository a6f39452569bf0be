import type { BandMargin } from './margins';
import { refreshBandRemarks, remarksOnBands, remarksOnSettings, scallopingLossDb } from './sweep-remarks';

const grid = { pointCount: 6634, startHz: 150e3, stopHz: 30e6, medianStepHz: 4500 };
const band: BandMargin = {
  band: '0.15-0.5 MHz',
  worst: { marginDb: 8, frequencyHz: 156e3, levelDbuv: 57, limitDbuv: 65, interpolated: false },
  coveredFraction: 1,
  floorDbuv: 20,
  floorMarginDb: 36,
};

describe('scallopingLossDb', () => {
  // Gaussian 6 dB filter: half a bandwidth off centre is 6.02 dB down by definition, and the loss goes with the square.
  it.each([
    [9000, 6.02],
    [4500, 1.51],
    [2250, 0.38],
  ])('of %d Hz steps with 9 kHz is %d dB', (stepHz, lossDb) => {
    expect(scallopingLossDb(stepHz, 9000)).toBeCloseTo(lossDb, 2);
  });
});

describe('remarksOnSettings', () => {
  it('is silent about a 9 kHz receiver in steps of half its bandwidth', () => {
    expect(remarksOnSettings({ rbwHz: 9000, grid })).toEqual([]);
  });

  it('keeps the tolerance of CISPR 16-1-1 for band B, 8 to 10 kHz', () => {
    expect(remarksOnSettings({ rbwHz: 10_000, grid })).toEqual([]);
    expect(remarksOnSettings({ rbwHz: 10_001, grid }).map(({ code }) => code)).toEqual(['bandwidth']);
  });

  it('names the loss between points that lie too far apart', () => {
    const [remark] = remarksOnSettings({ rbwHz: 9000, grid: { ...grid, medianStepHz: 9000 } });
    expect(remark).toMatchObject({ code: 'coarseStep', text: expect.stringContaining('up to 6.0 dB low') });
  });

  it('says when nobody stated the bandwidth', () => {
    expect(remarksOnSettings({ rbwHz: null, grid }).map(({ code }) => code)).toEqual(['bandwidthUnknown']);
  });
});

describe('remarksOnBands', () => {
  it('is silent about a whole band with a low floor', () => {
    expect(remarksOnBands([band])).toEqual([]);
  });

  it('says how much of a band is measured', () => {
    expect(remarksOnBands([{ ...band, coveredFraction: 0.574 }])[0]?.text).toBe(
      '0.15-0.5 MHz: only 57 % of the band is measured',
    );
    expect(remarksOnBands([{ ...band, worst: null, coveredFraction: 0, floorMarginDb: null }])[0]?.code).toBe(
      'notCovered',
    );
  });

  it('remarks a floor less than the 6 dB of CISPR 16-2-1 below the limit', () => {
    expect(remarksOnBands([{ ...band, floorMarginDb: 6 }])).toEqual([]);
    expect(remarksOnBands([{ ...band, floorMarginDb: 5.9 }])[0]?.text).toContain('only 5.9 dB below the limit');
    expect(remarksOnBands([{ ...band, floorMarginDb: -2 }])[0]?.text).toContain('2.0 dB above the limit');
  });
});

describe('refreshBandRemarks', () => {
  it('replaces what is said of bands and leaves the rest', () => {
    const uncorrected = { code: 'uncorrected', text: 'levels are uncorrected readings' };
    const old = { code: 'notCovered', text: 'Radio 0.5-1.6 MHz: not measured' };
    expect(refreshBandRemarks([old, uncorrected], [band])).toEqual([uncorrected]);
    expect(refreshBandRemarks([uncorrected], [{ ...band, worst: null }])).toEqual([
      uncorrected,
      { code: 'notCovered', text: '0.15-0.5 MHz: not measured' },
    ]);
  });
});
