import { HttpErrorResponse } from '@angular/common/http';
import type { BuildSummary } from '@shared/contracts/builds';
import type { OverlayTrace, SweepView } from '@shared/contracts/sweeps';
import { decodeFrames, encodeFrames } from '@shared/traces/frames';
import { closestSeries } from './closest-series';
import { harmonicMarks } from './harmonic-marks';
import { idsOf, spectrumQuery, spectrumViewOf } from './overlay-address';
import { overlayBuilds } from './overlay-builds';
import { overlayPicture } from './overlay-traces';
import { problemOfFrames } from './problem-of-frames';

const FULL = { fromHz: 150_000, toHz: 30_000_000 };

function build(id: number, other: Partial<BuildSummary> = {}): BuildSummary {
  return { id, position: id, sweepCount: 18, isReference: false, ...other } as BuildSummary;
}

describe('the address of an overlay', () => {
  it('reads ids once each and leaves out what is none', () => {
    expect(idsOf('16,11,x,16,-2,')).toEqual([16, 11]);
    expect(idsOf(undefined)).toEqual([]);
  });

  it('gives back zoom and pins as it kept them', () => {
    const query = spectrumQuery({ fromHz: 150_000, toHz: 500_000, pinsHz: [156_100, 312_000] }, FULL);
    expect(query).toEqual({ fromHz: 150_000, toHz: 500_000, pins: '156100,312000' });
    expect(spectrumViewOf('150000', '500000', '156100,312000')).toEqual({
      fromHz: 150_000,
      toHz: 500_000,
      pinsHz: [156_100, 312_000],
    });
  });

  it('says nothing for the whole range and takes no zoom that runs backward', () => {
    expect(spectrumQuery({ ...FULL, pinsHz: [] }, FULL)).toEqual({ fromHz: null, toHz: null, pins: null });
    expect(spectrumViewOf('500000', '150000', undefined)).toEqual({});
  });
});

describe('the builds of an overlay', () => {
  const builds = [build(1), build(2, { isReference: true }), build(3), build(4, { sweepCount: 0 }), build(5)];

  it('are by themselves the newest measured one, the reference and the measured one before', () => {
    const { chosen, lead } = overlayBuilds(builds, undefined);
    expect(chosen.map(({ id }) => id)).toEqual([5, 2, 3]);
    expect(lead?.id).toBe(5);
  });

  it('are no build twice where the reference is the one before', () => {
    expect(overlayBuilds(builds.slice(0, 3), undefined).chosen.map(({ id }) => id)).toEqual([3, 2]);
  });

  it('are those of the address in its order, led by the newest that was measured', () => {
    const { chosen, lead } = overlayBuilds(builds, [1, 4, 99, 3]);
    expect(chosen.map(({ id }) => id)).toEqual([1, 4, 3]);
    expect(lead?.id).toBe(3);
  });
});

describe('the series closest to the limit', () => {
  const sweep = (state: string, line: string, detector: string, marginDb: number) =>
    ({ kind: 'product', state, line, detector, worst: { marginDb } }) as SweepView;
  const sweeps = [sweep('full', 'L', 'PK', -3), sweep('full', 'L', 'AV', 2), sweep('idle', 'N', 'QP', 1)];

  it('is never a PK reading where another detector was measured', () => {
    expect(closestSeries(sweeps, {})).toEqual({ state: 'idle', line: 'N', detector: 'QP' });
  });

  it('stays within the choice', () => {
    expect(closestSeries(sweeps, { state: 'full' })).toEqual({ state: 'full', line: 'L', detector: 'AV' });
    expect(closestSeries(sweeps, { detector: 'PK' })).toEqual({ state: 'full', line: 'L', detector: 'PK' });
    expect(closestSeries(sweeps, { line: 'N', detector: 'AV' })).toBeNull();
  });
});

describe('the picture of an overlay', () => {
  const meta = (sweepId: number, buildId: number, other: Partial<OverlayTrace> = {}): OverlayTrace => ({
    sweepId,
    label: '',
    buildId,
    hardware: 'C2',
    firmware: `1.${buildId}`,
    state: 'full load',
    bench: 'bench-1',
    line: 'L',
    detector: 'QP',
    kind: 'product',
    run: 'a',
    takenAt: '2026-11-26T05:00:00.000Z',
    worst: null,
    limit: { detector: 'QP', title: 'Class B, QP', segments: [{ fromHz: 1, toHz: 2, fromDbuv: 66, toDbuv: 56 }] },
    ...other,
  });
  const frame = (metas: OverlayTrace[]) =>
    decodeFrames<OverlayTrace>(
      encodeFrames({
        grids: [Float64Array.of(150e3, 151e3)],
        traces: metas.map((one) => ({ grid: 0, meta: one, levelsDbuv: Float32Array.of(40, 41) })),
      }),
    );

  it('puts the build in question first and the background last, each in its role', () => {
    const { traces } = overlayPicture(
      frame([meta(1, 7, { kind: 'background' }), meta(2, 8), meta(3, 6), meta(4, 5)]),
      8,
      6,
    );
    expect(traces.map(({ id, role }) => [id, role])).toEqual([
      ['2', 'build'],
      ['3', 'reference'],
      ['4', 'other'],
      ['1', 'background'],
    ]);
    expect([...traces[0].frequenciesHz]).toEqual([150e3, 151e3]);
  });

  it('names the operating state only where there are several', () => {
    expect(overlayPicture(frame([meta(1, 8)]), 8, 6).traces[0].label).toBe('C2 / 1.8, L, QP');
    const two = overlayPicture(frame([meta(1, 8), meta(2, 8, { state: 'idle' })]), 8, 6);
    expect(two.traces[1].label).toBe('C2 / 1.8, idle, L, QP');
  });

  it('draws each limit line once', () => {
    const { limits } = overlayPicture(frame([meta(1, 8), meta(2, 6)]), 8, 6);
    expect(limits.map(({ name }) => name)).toEqual(['Class B, QP']);
  });
});

describe('harmonics in view', () => {
  it('begin where the picture begins: a 78 kHz stage enters the band with its 2nd', () => {
    const marks = harmonicMarks({ stage: 'PFC', frequencyHz: 78e3 }, { fromHz: 150e3, toHz: 320e3 });
    expect(marks).toEqual([
      { frequencyHz: 156e3, label: 'PFC n=2' },
      { frequencyHz: 234e3, label: 'PFC n=3' },
      { frequencyHz: 312e3, label: 'PFC n=4' },
    ]);
  });

  it('are no more than can be told apart, and none above the view', () => {
    expect(harmonicMarks({ stage: 'PFC', frequencyHz: 78e3 }, FULL)).toHaveLength(24);
    expect(harmonicMarks({ stage: 'PFC', frequencyHz: 31e6 }, FULL)).toEqual([]);
  });
});

describe('a failed binary request', () => {
  const failed = (body: string) =>
    new HttpErrorResponse({ status: 400, error: Uint8Array.from(body, (letter) => letter.charCodeAt(0)).buffer });

  it('says what the server said, though it came as bytes', () => {
    const problem = { type: '/problems/invalid', title: '', status: 400, detail: 'An overlay holds 40 traces.' };
    expect(problemOfFrames(failed(JSON.stringify(problem)))).toEqual(problem);
  });

  it('says the status where the body says nothing', () => {
    expect(problemOfFrames(failed('<html>')).detail).toBe('The server answered with status 400.');
  });
});
