import { decimate } from '@shared/traces/decimate';
import { fractionAt, type FrequencyRange, frequencyTicksHz, tickLabel } from '../ui/chart/frequency-scale';
import { levelRange } from '../ui/chart/level-range';
import type { OverlayScene } from './overlay-scene';

export const PICTURE = { width: 760, height: 300, left: 34, right: 14, top: 8, bottom: 22 } as const;

/** A spectrum as lines on paper. */
export interface SheetPictureShape {
  traces: { id: string; role: string; points: string }[];
  limits: { name: string; points: string }[];
  ticks: { x: number; label: string }[];
  levels: { y: number; label: string }[];
  worstX: number | null;
}

/** Turns the overlay into lines of the paper's picture; every peak is kept. */
export function sheetPictureShape(
  { traces, limits }: Pick<OverlayScene, 'traces' | 'limits'>,
  range: FrequencyRange,
  worstHz: number | null,
): SheetPictureShape {
  const { width, height, left, right, top, bottom } = PICTURE;
  const ends = levelRange(traces, limits);
  const x = (frequencyHz: number) => left + fractionAt(frequencyHz, range) * (width - left - right);
  const y = (levelDbuv: number) =>
    top + ((ends.toDbuv - levelDbuv) / (ends.toDbuv - ends.fromDbuv)) * (height - top - bottom);
  const point = (frequencyHz: number, levelDbuv: number) => `${x(frequencyHz).toFixed(1)},${y(levelDbuv).toFixed(1)}`;
  const stepDb = ends.toDbuv - ends.fromDbuv > 60 ? 20 : 10;
  const levelCount = Math.floor((ends.toDbuv - ends.fromDbuv) / stepDb) + 1;
  return {
    traces: traces.map(({ id, role, frequenciesHz, levelsDbuv }) => {
      const thinned = decimate(frequenciesHz, levelsDbuv, range.fromHz, range.toHz, width - left - right);
      const points = Array.from(thinned.levels, (levelDbuv, i) => point(thinned.frequenciesHz[i], levelDbuv));
      return { id, role, points: points.join(' ') };
    }),
    limits: limits.map(({ name, line }) => ({
      name,
      points: line.segments
        .map(({ fromHz, toHz, fromDbuv, toDbuv }) => `${point(fromHz, fromDbuv)} ${point(toHz, toDbuv)}`)
        .join(' '),
    })),
    ticks: frequencyTicksHz(range).map((tickHz) => ({ x: x(tickHz), label: tickLabel(tickHz) })),
    levels: Array.from({ length: levelCount }, (_, i) => ends.fromDbuv + i * stepDb).map((levelDbuv) => ({
      y: y(levelDbuv),
      label: String(levelDbuv),
    })),
    worstX: worstHz === null || worstHz < range.fromHz || worstHz > range.toHz ? null : x(worstHz),
  };
}
