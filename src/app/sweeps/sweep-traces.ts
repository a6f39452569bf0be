import type { OverlayTrace } from '@shared/contracts/sweeps';
import { DETECTORS } from '@shared/detectors/detectors';
import type { LimitLine } from '@shared/limits/limit-line';
import type { Frames } from '@shared/traces/frames';
import type { SpectrumLimit, SpectrumTrace } from '../ui/chart/spectrum-types';

/** A sweep and, where one was taken that day on that bench, its background, as the chart draws them. */
export function sweepTraces({ grids, traces }: Frames<OverlayTrace>, sweepId: number): SpectrumTrace[] {
  return traces.map(({ meta, grid, levelsDbuv }) => ({
    id: String(meta.sweepId),
    label: meta.label,
    role: meta.sweepId === sweepId ? 'build' : 'background',
    detector: DETECTORS.find((detector) => detector === meta.detector) ?? 'PK',
    line: meta.line,
    frequenciesHz: grids[grid],
    levelsDbuv,
  }));
}

/** The limit line that the sweep is held against. */
export function sweepLimits({ traces }: Frames<OverlayTrace>, sweepId: number): SpectrumLimit[] {
  const own = traces.find(({ meta }) => meta.sweepId === sweepId);
  if (!own) return [];
  const { title, detector, segments } = own.meta.limit;
  return [{ name: title, line: { detector: detector as LimitLine['detector'], segments } }];
}
