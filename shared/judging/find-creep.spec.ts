import { cusumLoss } from './cusum-loss';
import { findCreep } from './find-creep';

const builds = (marginsDb: number[]) => marginsDb.map((marginDb, index) => ({ buildId: index + 1, marginDb }));

describe('cusumLoss', () => {
  it('finds the shift of Montgomery, table 9.2, turned into a loss: signal at 29, begun after 22', () => {
    const x = [
      9.45, 7.99, 9.29, 11.66, 12.16, 10.18, 8.04, 11.46, 9.2, 10.34, 9.03, 11.47, 10.51, 9.4, 10.08, 9.37, 10.62,
      10.31, 8.52, 10.84, 10.9, 9.33, 12.29, 11.5, 10.6, 11.08, 10.38, 11.62, 11.31, 10.52,
    ];
    const loss = cusumLoss(builds(x.map((value) => -value)), -10, 1);
    expect(loss).toMatchObject({ startBuildId: 23, signalBuildId: 29 });
    // Montgomery: the new mean is estimated at 10 + 0.5 + 5.28 / 7 = 11.25.
    expect(loss?.lossDb).toBeCloseTo(1.25, 2);
  });

  it('stays silent on a gain', () => {
    expect(cusumLoss(builds(new Array<number>(20).fill(14)), 10, 0.7)).toBeNull();
  });

  it('needs a spread', () => {
    expect(() => cusumLoss([], 10, 0)).toThrow(RangeError);
  });
});

describe('findCreep', () => {
  const creeping = builds(Array.from({ length: 15 }, (_, index) => 10 - 0.3 * index));

  it('gives slope and builds left to the target of a straight loss (by hand: 5.8 dB left, 1.7 dB above target, 5.67 builds)', () => {
    const creep = findCreep(creeping, 10, 0.7, 4.1);
    expect(creep?.slopeDbPerBuild).toBeCloseTo(-0.3, 12);
    expect(creep?.buildsToTarget).toBe(6);
    expect(creep?.startBuildId).toBe(3);
  });

  it('says 0 builds once the line has reached the target', () => {
    expect(findCreep(creeping, 10, 0.7, 6)?.buildsToTarget).toBe(0);
  });

  it('leaves a step to the drops, and what a slope does not certainly lose to nobody', () => {
    expect(findCreep(builds([10, 10.1, 9.9, 10, 10.1, 7, 7.1, 6.9, 7, 7.1, 7]), 10, 0.7, 4)).toBeNull();
    expect(findCreep(builds([10, 6, 10, 6, 10, 6, 10, 6, 10, 6]), 10, 0.7, 4)).toBeNull();
  });

  it('is silent about less than 1 dB over the whole series, however certain', () => {
    const barely = builds(Array.from({ length: 20 }, (_, index) => 10 - 0.04 * index));
    expect(cusumLoss(barely, 10, 0.05)).not.toBeNull();
    expect(findCreep(barely, 10, 0.05, 4)).toBeNull();
  });

  it('finds nothing in a level series', () => {
    expect(findCreep(builds([10, 9.6, 10.4, 9.8, 10.1, 10.3, 9.7]), 10, 0.7, 4)).toBeNull();
  });
});
