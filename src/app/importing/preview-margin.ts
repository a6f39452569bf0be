import type { Detector } from '@shared/detectors/detectors';
import { bandsFor } from '@shared/limits/bands';
import { cellEdgesHz } from '@shared/limits/cells';
import type { LimitSet } from '@shared/limits/limit-set';
import { lineForDetector } from '@shared/limits/limit-sets';
import { type MarginPoint, prepareGrid, sweepMargins } from '@shared/traces/margins';

/** The worst margin a trace will have once it is stored, by the arithmetic of the server; null where no limit applies. */
export function previewMargin(
  frequenciesHz: Float64Array,
  levelsDbuv: Float32Array,
  set: LimitSet,
  detector: Detector,
): MarginPoint | null {
  const line = lineForDetector(set, detector);
  if (!line) return null;
  return sweepMargins(levelsDbuv, prepareGrid(frequenciesHz, line, bandsFor(line), cellEdgesHz())).worst;
}
