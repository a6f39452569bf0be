import { limitAt, type LimitLine } from '@shared/limits/limit-line';
import { CHART_FONT, textWidthPx } from './axis-look';
import { fractionAt, frequencyAt } from './frequency-scale';
import type { SpectrumScene } from './spectrum-scene';
import type { SpectrumLimit } from './spectrum-types';

/** A limit line, heavy and neutral, with its name written on it. */
export function limitSeries({ name, written = name, line }: SpectrumLimit, scene: SpectrumScene) {
  const { levels, palette } = scene;
  const points = line.segments.flatMap(({ fromHz, toHz, fromDbuv, toDbuv }) => [
    [fromHz / 1e6, fromDbuv],
    [toHz / 1e6, toDbuv],
  ]);
  const drawn = {
    type: 'line',
    data: points,
    silent: true,
    showSymbol: false,
    z: 6,
    lineStyle: { color: palette.limit, width: 2.4 },
  };
  const place = namePlace(written, line, scene);
  if (!place || place.levelDbuv > levels.toDbuv) return [drawn];
  const label = {
    type: 'scatter',
    data: [[place.frequencyHz / 1e6, place.levelDbuv]],
    silent: true,
    z: 7,
    symbolSize: 0.1,
    label: {
      show: true,
      formatter: written,
      position: [-6, -6],
      align: 'right',
      verticalAlign: 'bottom',
      color: palette.limit,
      fontFamily: CHART_FONT,
      fontSize: 12,
      fontWeight: 500,
      textBorderColor: palette.surface,
      textBorderWidth: 3,
    },
  };
  return [drawn, label];
}

/** Right end of the line in view, as high as the line is anywhere under its name. */
function namePlace(name: string, line: LimitLine, { range, columns }: SpectrumScene) {
  const frequencyHz = Math.min(range.toHz, line.segments[line.segments.length - 1].toHz);
  const end = fractionAt(frequencyHz, range);
  const begin = Math.max(0, end - textWidthPx(name) / columns);
  const levels = [end, begin].map((fraction) => limitAt(line, Math.min(frequencyHz, frequencyAt(fraction, range))));
  const known = levels.filter((levelDbuv) => levelDbuv !== null);
  return end <= 0 || known.length === 0 ? null : { frequencyHz, levelDbuv: Math.max(...known) };
}
