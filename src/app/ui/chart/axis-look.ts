import type { ChartPalette } from './chart-palette';
import { FrequencyRange, frequencyTicksHz, tickLabel } from './frequency-scale';

export const CHART_FONT = "'Noto Sans', sans-serif";

/** About how wide a text of 12 px is drawn. */
export function textWidthPx(text: string): number {
  return 7 * text.length + 8;
}

/** What all axes share: 12 px labels, hairline grid. */
export function axisLook(palette: ChartPalette) {
  return {
    axisLine: { show: true, lineStyle: { color: palette.outline } },
    axisTick: { show: true, lineStyle: { color: palette.outline } },
    axisLabel: { color: palette.inkMuted, fontSize: 12, fontFamily: CHART_FONT },
    nameTextStyle: { color: palette.inkMuted, fontSize: 12, fontFamily: CHART_FONT },
    splitLine: { show: true, lineStyle: { color: palette.hairline, width: 1 } },
  };
}

/** Log frequency axis in MHz with the trade's ticks; the minor lines are the decades' own 2 to 9. */
export function frequencyAxis(range: FrequencyRange, palette: ChartPalette) {
  const look = axisLook(palette);
  const ticksMhz = frequencyTicksHz(range).map((tickHz) => tickHz / 1e6);
  return {
    ...look,
    type: 'log',
    min: range.fromHz / 1e6,
    max: range.toHz / 1e6,
    name: 'Frequency, Hz',
    nameLocation: 'middle',
    nameGap: 24,
    axisTick: { ...look.axisTick, customValues: ticksMhz },
    axisLabel: {
      ...look.axisLabel,
      customValues: ticksMhz,
      hideOverlap: true,
      formatter: (frequencyMhz: number) => tickLabel(frequencyMhz * 1e6),
    },
    splitLine: { show: false },
  };
}
