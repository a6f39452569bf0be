import { aBand, aBuildInput, aRun, aSeries } from '../../test/builders/judging';
import type { SeriesInput } from './build-input';
import { dropsOf } from './drops-of';
import { judgeBuild } from './judge-build';

const lossy = (marginDb: number, overrides: Partial<SeriesInput> = {}, band = '0.15-0.5 MHz') =>
  aSeries({ ...overrides, bands: [aBand({ band, build: [aRun({ marginDb, buildId: 9 })] })] });
const dropsIn = (...series: SeriesInput[]) => dropsOf(judgeBuild(aBuildInput({ series })));

describe('dropsOf', () => {
  it('makes one drop of a harmonic seen on both lines and by two detectors', () => {
    const drops = dropsIn(lossy(1.4), lossy(1, { line: 'N' }), lossy(2, { detector: 'AV' }));
    expect(drops).toHaveLength(1);
    expect(drops[0].witnesses.map(({ line, detector }) => `${line} ${detector}`)).toEqual(['N QP', 'L QP', 'L AV']);
    expect(drops[0].lead.line).toBe('N');
    expect(drops[0].leastMarginDb).toBe(1);
    expect(drops[0].sizeDb).toBeCloseTo(7, 12);
  });

  it('keeps states and bands apart', () => {
    expect(dropsIn(lossy(1), lossy(1, { stateId: 2 }), lossy(1, {}, '0.5-5 MHz'))).toHaveLength(3);
  });

  it('makes none of what was held or gained', () => {
    expect(dropsIn(lossy(8), lossy(14, { line: 'N' }))).toEqual([]);
  });

  it('ranks over the limit first, then the least margin left', () => {
    const drops = dropsIn(lossy(3, { stateId: 1 }), lossy(0.5, { stateId: 2 }), lossy(-0.2, { stateId: 3 }));
    expect(drops.map(({ stateId }) => stateId)).toEqual([3, 2, 1]);
    expect(drops[0].overLimit).toBe(true);
  });
});
