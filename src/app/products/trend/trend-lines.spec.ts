import type { TrendView } from '@shared/contracts/margins';
import type { ProductView } from '@shared/contracts/products';
import { switchingChanges } from './switching-changes';
import { trendBuilds, trendSeries } from './trend-series';
import { trendAsks, trendSplit } from './trend-split';

type Point = TrendView['points'][number];

function point(buildId: number, other: Partial<Point> = {}): Point {
  return {
    buildId,
    hardware: 'C2',
    firmware: `1.${buildId}`,
    builtAt: '2026-11-26T05:00:00.000Z',
    worstMarginDb: 4,
    worstFrequencyHz: 156_000,
    runs: 1,
    lowestDb: 4,
    highestDb: 4,
    verdict: 'held',
    openDrops: 0,
    switching: [],
    ...other,
  };
}

function view(points: Point[]): TrendView {
  return {
    product: 'a',
    limitSetKey: 'CISPR32_B',
    targetMarginDb: 3,
    band: null,
    bands: [],
    referenceBuildId: 2,
    points,
  };
}

const product = {
  states: [{ name: 'full load' }, { name: 'idle' }],
  lines: ['L', 'N'],
  detectors: ['AV', 'PK', 'QP'],
} as ProductView;

describe('the lines of a trend', () => {
  it('is one for the choice as it stands', () => {
    expect(trendAsks(null, { line: 'L' }, '5-30 MHz', product, [])).toEqual([
      { label: '5-30 MHz, L, all states and detectors', query: { line: 'L', band: '5-30 MHz' } },
    ]);
  });

  it('is one for each band within the choice', () => {
    expect(trendAsks('band', { line: 'L' }, undefined, product, ['0.15-0.5 MHz', '0.5-5 MHz'])).toEqual([
      { label: '0.15-0.5 MHz', query: { line: 'L', band: '0.15-0.5 MHz' } },
      { label: '0.5-5 MHz', query: { line: 'L', band: '0.5-5 MHz' } },
    ]);
  });

  it('orders detectors as the trade does and lets the lines stand over a filter of the same kind', () => {
    const asks = trendAsks('detector', { detector: 'PK' }, undefined, product, []);
    expect(asks.map(({ query }) => query)).toEqual([{ detector: 'PK' }, { detector: 'QP' }, { detector: 'AV' }]);
  });

  it('takes an unknown split for none', () => {
    expect(trendSplit('bench')).toBeNull();
  });
});

describe('points of a trend', () => {
  const builds = trendBuilds(view([point(1), point(2), point(3)]));

  it('marks the reference', () => {
    expect(builds.map(({ isReference }) => isReference)).toEqual([false, true, false]);
  });

  it('leaves a gap where a build was not measured or is missing in the answer', () => {
    const series = trendSeries('L', view([point(1), point(2, { worstMarginDb: null })]), builds);
    expect(series.points.map((one) => one?.marginDb ?? null)).toEqual([4, null, null]);
  });

  it('gives a spread to repeated runs only', () => {
    const repeated = point(1, { runs: 3, lowestDb: 3.5, highestDb: 4.5 });
    const [first, second] = trendSeries('L', view([repeated, point(2)]), builds).points;
    expect([first?.lowestDb, first?.highestDb]).toEqual([3.5, 4.5]);
    expect([second?.lowestDb, second?.highestDb]).toEqual([null, null]);
  });
});

describe('switching frequencies along a trend', () => {
  it('lists what changed, newest first, past builds that declare nothing', () => {
    const pfc = (frequencyHz: number) => [{ stage: 'PFC', frequencyHz }];
    const points = [
      point(1, { switching: pfc(65e3) }),
      point(2, { switching: pfc(65e3) }),
      point(3),
      point(4, { switching: [...pfc(78e3), { stage: 'LLC', frequencyHz: 112e3 }] }),
    ];
    expect(switchingChanges(points).map(({ buildId, stage, fromHz, toHz }) => [buildId, stage, fromHz, toHz])).toEqual([
      [4, 'LLC', null, 112e3],
      [4, 'PFC', 65e3, 78e3],
      [1, 'PFC', null, 65e3],
    ]);
  });
});
