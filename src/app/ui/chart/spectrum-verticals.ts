import { CHART_FONT, textWidthPx } from './axis-look';
import { fractionAt, frequencyTicksHz } from './frequency-scale';
import type { SpectrumScene } from './spectrum-scene';

const LABEL = { show: true, position: 'end', fontSize: 12, fontFamily: CHART_FONT } as const;

/** Upright lines: grid at the ticks, harmonics (dashed, named in the upper row), pins (accent, numbered in the lower row). */
export function spectrumVerticals({ marks, pinsHz, range, columns, palette }: SpectrumScene) {
  const isInView = (frequencyHz: number) => frequencyHz >= range.fromHz && frequencyHz <= range.toHz;
  const ticks = frequencyTicksHz(range).map((tickHz) => ({
    xAxis: tickHz / 1e6,
    label: { show: false },
    lineStyle: { color: palette.hairline, width: 1, type: 'solid' },
  }));

  let takenPx = -Infinity;
  const harmonics = marks
    .filter(({ frequencyHz }) => isInView(frequencyHz))
    .sort((a, b) => a.frequencyHz - b.frequencyHz)
    .map(({ frequencyHz, label }) => {
      const halfPx = textWidthPx(label) / 2;
      const middlePx = fractionAt(frequencyHz, range) * columns;
      const hasRoom = middlePx - halfPx > takenPx;
      if (hasRoom) takenPx = middlePx + halfPx;
      return {
        xAxis: frequencyHz / 1e6,
        label: { ...LABEL, show: hasRoom, distance: 20, formatter: label, color: palette.inkMuted },
        lineStyle: { color: palette.inkMuted, width: 1, type: [3, 4] },
      };
    });

  const pins = pinsHz.filter(isInView).map((pinHz) => ({
    xAxis: pinHz / 1e6,
    label: {
      ...LABEL,
      distance: 4,
      formatter: String(pinsHz.indexOf(pinHz) + 1),
      color: palette.accent,
      fontWeight: 700,
    },
    lineStyle: { color: palette.accent, width: 1.5, type: 'solid' },
  }));
  return { symbol: 'none', silent: true, animation: false, data: [...ticks, ...harmonics, ...pins] };
}
