import type { DropView, DropWitness } from '@shared/contracts/drops';
import type { OverlayTrace } from '@shared/contracts/sweeps';
import type { Detector } from '@shared/detectors/detectors';
import type { LimitDetector } from '@shared/limits/limit-line';
import type { Frames } from '@shared/traces/frames';
import type { SpectrumLimit, SpectrumMark, SpectrumTrace } from '../ui/chart/spectrum-types';
import { formatTime } from '../ui/format-time';
import { seriesName } from './lead-witness';

/** What the chart of a drop draws. */
export interface OverlayScene {
  /** Series on show, such as "L AV". */
  series: string;
  traces: SpectrumTrace[];
  limits: SpectrumLimit[];
  marks: SpectrumMark[];
}

/** The series the address names; without one, or with one that did not lose, the one with the least margin left. */
export function witnessNamed({ evidence }: DropView, series: string | undefined): DropWitness {
  return evidence.witnesses.find((witness) => seriesName(witness) === series) ?? evidence.witnesses[0];
}

/** Witnesses see one harmonic at frequencies that differ by less than this share; half a step of the grid moves it no further. */
const SAME_LINE = 0.02;

/** More lines of one series than this hide each other. */
const MOST_RUNS = 12;

/** Sweeps to draw: the deciding one of either side, or the latest runs that were judged. */
export function sweepsToDraw({ judgement }: DropWitness, isEveryRun: boolean): number[] {
  if (isEveryRun)
    return [...judgement.referenceSweepIds.slice(-MOST_RUNS), ...judgement.buildSweepIds.slice(-MOST_RUNS)];
  const deciding = [judgement.referenceWorst?.sweepId, judgement.worst?.sweepId];
  return deciding.filter((id) => id !== undefined);
}

/** The build over its reference and the day's background, under the limit they are held against. */
export function overlayScene(
  drop: DropView,
  witness: DropWitness,
  { grids, traces }: Frames<OverlayTrace>,
  timeZone: string,
): OverlayScene {
  const drawn = traces.map(({ grid, meta, levelsDbuv }): SpectrumTrace => {
    const day = formatTime(meta.takenAt, timeZone, 'day');
    const role = roleOf(meta, drop);
    const subject = role === 'background' ? 'Background' : `${meta.hardware} / ${meta.firmware}`;
    return {
      id: String(meta.sweepId),
      label: `${subject}, ${day}`,
      role,
      detector: meta.detector as Detector,
      line: meta.line,
      frequenciesHz: grids[grid],
      levelsDbuv,
    };
  });
  const limits = new Map(traces.map(({ meta }) => [meta.limit.detector, meta.limit]));
  return {
    series: seriesName(witness),
    traces: drawn,
    limits: [...limits.values()].map(({ detector, title, segments }) => ({
      name: title,
      line: { detector: detector as LimitDetector, segments },
    })),
    marks: marksOf(drop, witness),
  };
}

/** The worst point by the name of its harmonic, and where it was before. */
function marksOf({ evidence }: DropView, { judgement }: DropWitness): SpectrumMark[] {
  const { worst, move } = judgement;
  if (worst === null) return [];
  const { harmonic } = evidence;
  const isHarmonic = harmonic !== null && Math.abs(worst.frequencyHz / harmonic.expectedHz - 1) < SAME_LINE;
  const label = isHarmonic ? `${harmonic.stage} n=${harmonic.order}` : 'worst now';
  const before = move?.moved ? [{ frequencyHz: move.fromHz, label: 'worst before' }] : [];
  return [{ frequencyHz: worst.frequencyHz, label }, ...before];
}

function roleOf({ kind, buildId }: OverlayTrace, drop: DropView): SpectrumTrace['role'] {
  if (kind === 'background') return 'background';
  return buildId === drop.buildId ? 'build' : 'reference';
}
