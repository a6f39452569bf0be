import type { SpectrumLimit, SpectrumTrace } from './spectrum-types';

const STEP_DB = 10;

/** Ends of the level axis: whole tens around all traces and limits, so that zooming along frequency keeps the scale. */
export function levelRange(traces: readonly SpectrumTrace[], limits: readonly SpectrumLimit[]) {
  let lowest = Infinity;
  let highest = -Infinity;
  for (const { levelsDbuv } of traces) {
    for (const levelDbuv of levelsDbuv) {
      if (levelDbuv < lowest) lowest = levelDbuv;
      if (levelDbuv > highest) highest = levelDbuv;
    }
  }
  for (const { line } of limits) {
    for (const { fromDbuv, toDbuv } of line.segments) highest = Math.max(highest, fromDbuv, toDbuv);
  }
  if (lowest > highest) lowest = Math.min(0, highest);
  if (!Number.isFinite(highest)) return { fromDbuv: 0, toDbuv: 80 };
  return {
    fromDbuv: Math.floor(Math.max(lowest, highest - 140) / STEP_DB) * STEP_DB,
    // Room for the name above the highest limit line.
    toDbuv: Math.ceil((highest + 4) / STEP_DB) * STEP_DB,
  };
}
