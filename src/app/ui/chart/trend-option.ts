import { formatDecibels } from '@shared/units/format-decibels';
import type { CustomSeriesRenderItemAPI, CustomSeriesRenderItemParams } from 'echarts/types/dist/shared';
import type { EChartsCoreOption } from 'echarts/core';
import { axisLook, CHART_FONT } from './axis-look';
import { BUILD_AXIS_MARGINS, buildAxis, buildStrip, referenceLine, STRIP_TOP_PX } from './build-axis';
import type { BuildRange } from './build-range';
import type { ChartPalette } from './chart-palette';
import type { PlotMargins } from './plot-margins';
import type { TrendBuild, TrendSeries } from './trend-types';
import { verdictSymbol } from './verdict-symbols';

export const TREND_MARGINS: PlotMargins = { ...BUILD_AXIS_MARGINS, top: STRIP_TOP_PX, bottom: 44 };

const SYMBOLS = ['circle', 'triangle', 'rect', 'diamond', 'roundRect'] as const;

export interface TrendScene {
  builds: readonly TrendBuild[];
  series: readonly TrendSeries[];
  targetMarginDb: number;
  range: BuildRange;
  margins: { fromDb: number; toDb: number };
  plotPx: number;
  palette: ChartPalette;
}

export interface TrendLook {
  colour: string;
  symbol: (typeof SYMBOLS)[number];
}

/** First series in the accent, others in the set of eight, each with its own marker. */
export function trendLooks(series: readonly TrendSeries[], palette: ChartPalette): TrendLook[] {
  return series.map((_, i) => ({
    colour: i === 0 ? palette.accent : palette.traces[(i - 1) % palette.traces.length],
    symbol: SYMBOLS[i % SYMBOLS.length],
  }));
}

export function trendOption(scene: TrendScene): EChartsCoreOption {
  const { builds, series, range, margins, plotPx, palette } = scene;
  const look = axisLook(palette);
  const looks = trendLooks(series, palette);
  return {
    animation: false,
    grid: { ...TREND_MARGINS, containLabel: false, outerBoundsMode: 'none' },
    xAxis: buildAxis(builds, range, plotPx, palette),
    yAxis: {
      ...look,
      type: 'value',
      min: margins.fromDb,
      max: margins.toDb,
      interval: margins.toDb - margins.fromDb > 40 ? 10 : 5,
      // The lower end need not be a whole step.
      axisLabel: { ...look.axisLabel, showMinLabel: margins.fromDb % 5 === 0, formatter: '{value} dB' },
    },
    series: [
      { type: 'line', data: [], silent: true, z: 1, markArea: overArea(scene) },
      ...(isCrowded(range) ? [] : series.map((one, i) => spreadBars(one, looks[i]))),
      ...series.map((one, i) => marginLine(one, looks[i], range)),
      { type: 'line', data: [], silent: true, z: 6, markLine: guides(scene) },
      dropFlags(scene),
      buildStrip(builds, range, margins.toDb, palette),
    ],
  };
}

function marginLine({ points }: TrendSeries, { colour, symbol }: TrendLook, { from, to }: BuildRange) {
  return {
    type: 'line',
    data: points.map((point, i) => [i + 0.5, point?.marginDb ?? null]),
    silent: true,
    connectNulls: false,
    showAllSymbol: true,
    symbol,
    symbolSize: isCrowded({ from, to }) ? 3.5 : 6.5,
    z: 5,
    lineStyle: { color: colour, width: 1.6 },
    itemStyle: { color: colour },
  };
}

/** Builds stand too close for spread bars and full-size markers. */
function isCrowded({ from, to }: BuildRange): boolean {
  return to - from > 120;
}

/** From the lowest to the highest run of a build, as an upright bar with short ends. */
function spreadBars({ points }: TrendSeries, { colour }: TrendLook) {
  const data = points.flatMap((point, i) =>
    point && point.lowestDb !== null && point.highestDb !== null && point.highestDb > point.lowestDb
      ? [[i + 0.5, point.lowestDb, point.highestDb]]
      : [],
  );
  return {
    type: 'custom',
    data,
    silent: true,
    clip: true,
    z: 4,
    encode: { x: 0, y: [1, 2] },
    renderItem: (_: CustomSeriesRenderItemParams, api: CustomSeriesRenderItemAPI) => {
      const [x, low] = api.coord([api.value(0), api.value(1)]);
      const high = api.coord([api.value(0), api.value(2)])[1];
      const d = `M${x} ${low}V${high}M${x - 3.5} ${low}h7M${x - 3.5} ${high}h7`;
      return { type: 'path', shape: { pathData: d }, style: { fill: 'none', stroke: colour, lineWidth: 1.2 } };
    },
  };
}

function dropFlags({ builds, series, range, margins, palette }: TrendScene) {
  const data = builds.slice(range.from, range.to).flatMap(({ openDrops }, i) => {
    if (openDrops === 0) return [];
    const measured = series.map(({ points }) => points[range.from + i]?.marginDb).filter((m) => m !== undefined);
    return [{ value: [range.from + i + 0.5, Math.min(margins.toDb, ...measured)] }];
  });
  return {
    type: 'scatter',
    data,
    silent: true,
    z: 7,
    symbolSize: isCrowded(range) ? 9 : 14,
    symbolOffset: [0, isCrowded(range) ? 10 : 15],
    ...verdictSymbol('drop', palette),
  };
}

function overArea({ margins, palette }: TrendScene) {
  return {
    silent: true,
    itemStyle: { color: palette.lostGround, opacity: 0.6 },
    data: margins.fromDb < 0 ? [[{ yAxis: margins.fromDb }, { yAxis: 0 }]] : [],
  };
}

function guides({ builds, targetMarginDb, palette }: TrendScene) {
  const label = {
    show: true,
    position: 'insideEndTop',
    fontSize: 12,
    fontFamily: CHART_FONT,
    textBorderColor: palette.surface,
    textBorderWidth: 3,
  };
  return {
    symbol: 'none',
    silent: true,
    data: [
      {
        yAxis: 0,
        label: { ...label, formatter: 'limit', color: palette.limit, fontWeight: 500 },
        lineStyle: { color: palette.limit, width: 2.4, type: 'solid' },
      },
      ...(targetMarginDb > 0
        ? [
            {
              yAxis: targetMarginDb,
              label: { ...label, formatter: `target ${formatDecibels(targetMarginDb)}`, color: palette.inkMuted },
              lineStyle: { color: palette.inkMuted, width: 1.2, type: [6, 4] },
            },
          ]
        : []),
      ...referenceLine(builds, palette),
    ],
  };
}
