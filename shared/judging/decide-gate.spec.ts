import { aBand, aBuildInput, aRun, aSeries } from '../../test/builders/judging';
import { decideGate, type GateInput } from './decide-gate';
import { judgeBuild } from './judge-build';
import type { BandInput } from './build-input';

const BAND = '0.15-0.5 MHz';
const required = [{ stateName: '230 V full load', line: 'L' as const, detector: 'QP' as const, bands: [BAND] }];

const gate = (band: Partial<BandInput>, overrides: Partial<GateInput> = {}) =>
  decideGate({
    judgements: judgeBuild(aBuildInput({ series: [aSeries({ bands: [aBand(band)] })] })),
    isJudged: true,
    targetMarginDb: 6,
    required,
    ...overrides,
  });
const run = (marginDb: number, overrides = {}) => [aRun({ marginDb, buildId: 9, ...overrides })];
const codes = ({ reasons }: ReturnType<typeof gate>) => reasons.map(({ code }) => code);

describe('decideGate', () => {
  it('passes a build that held its margin above the target', () => {
    expect(gate({ build: run(8) })).toEqual({ verdict: 'pass', reasons: [] });
  });

  it('fails over the limit, short of the target, and on a loss', () => {
    expect(codes(gate({ build: run(-0.1) }))).toEqual(['overLimit', 'lost']);
    expect(codes(gate({ build: run(7.9) }, { targetMarginDb: 8 }))).toEqual(['underTarget']);
    const high = run(20).map(() => aRun({ marginDb: 20, buildId: 1 }));
    const lost = gate({ reference: high, history: high, build: run(9), spread: { sdDb: 0.5, degreesOfFreedom: 40 } });
    expect(lost.verdict).toBe('fail');
    expect(codes(lost)).toEqual(['lost']);
  });

  it('is incomplete, never passed, without a measurement', () => {
    expect(gate({ build: [] })).toMatchObject({ verdict: 'incomplete' });
    expect(gate({}, { judgements: [] })).toMatchObject({ verdict: 'incomplete' });
    const twoStates = [...required, { ...required[0], stateName: '115 V full load' }];
    expect(codes(gate({ build: run(8) }, { required: twoStates }))).toEqual(['notMeasured']);
  });

  it('is incomplete where a band of a measured series is missing', () => {
    const bands = [BAND, '0.5-5 MHz'];
    expect(codes(gate({ build: run(8) }, { required: [{ ...required[0], bands }] }))).toEqual(['notMeasured']);
  });

  it('is incomplete before the build is judged', () => {
    expect(codes(gate({ build: run(8) }, { isJudged: false }))).toEqual(['notJudged']);
  });

  it.each([
    ['a guard', { build: run(16), guards: [{ code: 'constantOffset' as const, text: 'moved' }] }],
    ['a floor too high', { build: run(8), reference: [], floorMarginDb: 8 }],
    ['an unknown correction', { build: run(8, { correction: 'unknown' }) }],
    ['half a band on a first build', { build: run(8, { coveredFraction: 0.5 }), reference: [], history: [] }],
  ])('is incomplete after %s', (name, band) => {
    const build = name === 'a floor too high' ? run(8, { floorMarginDb: 8, backgroundLevelDbuv: null }) : band.build;
    expect(gate({ ...band, build }).verdict).toBe('incomplete');
  });

  it('is incomplete while a loss beyond the threshold is not settled', () => {
    const reference = [aRun({ marginDb: 11, buildId: 1 })];
    expect(codes(gate({ reference, history: reference, build: run(8.5) }))).toEqual(['cannotSay']);
  });

  it('passes a first build above the target: nothing required is missing', () => {
    expect(gate({ reference: [], previous: [], history: [], build: run(8) }).verdict).toBe('pass');
  });

  it('lists gaps beside faults, and fails', () => {
    const twoStates = [...required, { ...required[0], stateName: '115 V full load' }];
    const decision = gate({ build: run(5.9, {}) }, { required: twoStates });
    expect(decision.verdict).toBe('fail');
    expect(codes(decision)).toContain('notMeasured');
  });

  it('refuses to be a gate over nothing', () => {
    expect(() => gate({}, { required: [] })).toThrow(RangeError);
  });
});
