import type { OverlayTrace } from '@shared/contracts/sweeps';
import type { Frames } from '@shared/traces/frames';
import { dropView, witness } from '../../../test/builders/drop-builder';
import { overlayScene, sweepsToDraw, witnessNamed } from './overlay-scene';

const limit = { detector: 'AV', title: 'CISPR 32 class B, AV', segments: [] };
const meta = (given: Partial<OverlayTrace>) =>
  ({
    sweepId: 1,
    buildId: 16,
    hardware: 'C2',
    firmware: '4.1.0',
    kind: 'product',
    line: 'L',
    detector: 'AV',
    takenAt: '2026-11-27T23:30:00Z',
    limit,
    ...given,
  }) as OverlayTrace;

const FRAMES: Frames<OverlayTrace> = {
  grids: [new Float64Array([150e3, 300e3])],
  traces: [
    { grid: 0, meta: meta({ sweepId: 225, buildId: 11, firmware: '3.6.2' }), levelsDbuv: new Float32Array(2) },
    { grid: 0, meta: meta({ sweepId: 363 }), levelsDbuv: new Float32Array(2) },
    { grid: 0, meta: meta({ sweepId: 99, kind: 'background' }), levelsDbuv: new Float32Array(2) },
  ],
};

it('draws the build over its reference and the background, under each limit once, days in the zone of the team', () => {
  const scene = overlayScene(dropView(), witness(), FRAMES, 'Europe/Stockholm');
  expect(scene.traces.map(({ id, role, label }) => [id, role, label])).toEqual([
    ['225', 'reference', 'C2 / 3.6.2, 28 Nov 2026'],
    ['363', 'build', 'C2 / 4.1.0, 28 Nov 2026'],
    ['99', 'background', 'Background, 28 Nov 2026'],
  ]);
  expect(scene.limits.map(({ name }) => name)).toEqual(['CISPR 32 class B, AV']);
});

it('names the worst point by its harmonic and marks where it was before', () => {
  const marks = overlayScene(dropView(), witness(), FRAMES, 'UTC').marks;
  expect(marks).toEqual([
    { frequencyHz: 156_043, label: 'PFC n=2' },
    { frequencyHz: 195_134, label: 'worst before' },
  ]);
});

it('gives a harmonic to no point that lies elsewhere', () => {
  const elsewhere = witness({
    worst: { sweepId: 1, marginDb: 3, frequencyHz: 233_900, levelDbuv: 50, limitDbuv: 53 },
    move: null,
  });
  expect(overlayScene(dropView(), elsewhere, FRAMES, 'UTC').marks).toEqual([
    { frequencyHz: 233_900, label: 'worst now' },
  ]);
});

it('draws the deciding sweep of either side, or every run that was judged', () => {
  expect(sweepsToDraw(witness(), false)).toEqual([225, 363]);
  expect(sweepsToDraw(witness(), true)).toEqual([207, 225, 243, 363, 381, 399]);
});

it('falls back to the series with the least margin left when the address names another', () => {
  const drop = dropView({ evidence: { witnesses: [witness(), witness({ detector: 'QP' })] } });
  expect(witnessNamed(drop, 'L QP').detector).toBe('QP');
  expect(witnessNamed(drop, 'N PK').detector).toBe('AV');
});
