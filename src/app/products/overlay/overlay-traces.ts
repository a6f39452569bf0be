import { type Detector, DETECTORS } from '@shared/detectors/detectors';
import type { OverlayTrace } from '@shared/contracts/sweeps';
import type { LimitLine } from '@shared/limits/limit-line';
import type { Frames } from '@shared/traces/frames';
import type { SpectrumLimit, SpectrumTrace } from '../../ui/chart/spectrum-types';

export interface OverlayPicture {
  traces: SpectrumTrace[];
  limits: SpectrumLimit[];
  /** What each trace is, in the order of `traces`. */
  sweeps: OverlayTrace[];
}

const ROLE_ORDER = ['build', 'reference', 'other', 'background'] as const;

/** Turns a frame into what the spectrum draws: the build in question first, the background last. */
export function overlayPicture(
  frames: Frames<OverlayTrace>,
  leadId: number | undefined,
  referenceId: number | undefined,
): OverlayPicture {
  const severalStates = new Set(frames.traces.map(({ meta }) => meta.state)).size > 1;
  const drawn = frames.traces
    .map(({ grid, meta, levelsDbuv }) => ({
      sweep: meta,
      trace: {
        id: String(meta.sweepId),
        label: labelOf(meta, severalStates),
        role: roleOf(meta, leadId, referenceId),
        detector: meta.detector as Detector,
        line: meta.line,
        frequenciesHz: frames.grids[grid],
        levelsDbuv,
      },
    }))
    .sort(
      (a, b) =>
        ROLE_ORDER.indexOf(a.trace.role) - ROLE_ORDER.indexOf(b.trace.role) ||
        DETECTORS.indexOf(a.trace.detector) - DETECTORS.indexOf(b.trace.detector),
    );
  return {
    traces: drawn.map(({ trace }) => trace),
    sweeps: drawn.map(({ sweep }) => sweep),
    limits: limitsOf(frames.traces.map(({ meta }) => meta)),
  };
}

function roleOf({ kind, buildId }: OverlayTrace, leadId?: number, referenceId?: number): SpectrumTrace['role'] {
  if (kind === 'background') return 'background';
  if (buildId === leadId) return 'build';
  return buildId === referenceId ? 'reference' : 'other';
}

function labelOf(sweep: OverlayTrace, withState: boolean): string {
  const { kind, hardware, firmware, bench, state, line, detector } = sweep;
  const who = kind === 'background' ? `background of ${bench}` : `${hardware} / ${firmware}`;
  return [who, ...(withState ? [state] : []), line, detector].join(', ');
}

/** Each limit line once, by its detector. */
function limitsOf(sweeps: readonly OverlayTrace[]): SpectrumLimit[] {
  const limits = new Map<string, SpectrumLimit>();
  for (const { limit } of sweeps) {
    const line: LimitLine = { detector: limit.detector as LimitLine['detector'], segments: limit.segments };
    if (!limits.has(limit.detector)) limits.set(limit.detector, { name: limit.title, line });
  }
  return [...limits.values()];
}
