import { limitAt } from '@shared/limits/limit-line';
import { decimate } from '@shared/traces/decimate';
import type { EChartsCoreOption } from 'echarts/core';
import { axisLook, CHART_FONT, frequencyAxis } from './axis-look';
import type { ChartPalette } from './chart-palette';
import { FrequencyRange, frequencyTicksHz } from './frequency-scale';
import type { PlotMargins } from './plot-margins';
import { peakMarkers } from './peak-markers';
import type { SpectrumLimit, SpectrumMark, SpectrumTrace } from './spectrum-types';
import type { TraceLook } from './trace-look';

export const SPECTRUM_MARGINS: PlotMargins = { left: 52, right: 16, top: 20, bottom: 44 };

export interface SpectrumScene {
  traces: readonly SpectrumTrace[];
  looks: readonly TraceLook[];
  limits: readonly SpectrumLimit[];
  marks: readonly SpectrumMark[];
  pinsHz: readonly number[];
  range: FrequencyRange;
  levels: { fromDbuv: number; toDbuv: number };
  /** Width of the plot, px; each trace keeps its highest and lowest point of every column. */
  columns: number;
  palette: ChartPalette;
}

/** The drawing library's description of a spectrum: background, traces, limit lines with their names, pins. */
export function spectrumOption(scene: SpectrumScene): EChartsCoreOption {
  const { traces, looks, limits, range, levels, palette } = scene;
  const look = axisLook(palette);
  return {
    animation: false,
    grid: { ...SPECTRUM_MARGINS, containLabel: false },
    xAxis: frequencyAxis(range, palette),
    yAxis: {
      ...look,
      type: 'value',
      min: levels.fromDbuv,
      max: levels.toDbuv,
      interval: 10,
      name: 'dBµV',
      nameLocation: 'end',
      nameGap: 8,
      nameTextStyle: { ...look.nameTextStyle, align: 'right', padding: [0, 8, 0, 0] },
    },
    series: [
      { type: 'line', data: [], silent: true, z: 1, markLine: verticals(scene) },
      ...traces.flatMap((trace, i) => traceSeries(trace, looks[i], scene)),
      ...limits.flatMap((limit) => limitSeries(limit, scene)),
    ],
  };
}

function traceSeries(trace: SpectrumTrace, look: TraceLook, { range, columns, palette }: SpectrumScene) {
  const thinned = decimate(trace.frequenciesHz, trace.levelsDbuv, range.fromHz, range.toHz, columns);
  const isBackground = trace.role === 'background';
  const points = new Float64Array(2 * thinned.levels.length);
  thinned.levels.forEach((levelDbuv, i) => {
    points[2 * i] = thinned.frequenciesHz[i] / 1e6;
    points[2 * i + 1] = levelDbuv;
  });
  const line = {
    type: 'line',
    data: points,
    dimensions: ['frequencyMhz', 'levelDbuv'],
    silent: true,
    showSymbol: false,
    z: isBackground ? 2 : trace.role === 'build' ? 5 : trace.role === 'reference' ? 4 : 3,
    lineStyle: { color: look.colour, width: look.widthPx, type: look.dash, opacity: isBackground ? 0 : 1 },
    ...(isBackground ? { areaStyle: { color: look.colour, opacity: 1, origin: 'start' } } : {}),
  };
  if (isBackground) return [line];
  const markers = {
    type: 'scatter',
    data: peakMarkers(thinned, range),
    silent: true,
    z: line.z,
    symbol: look.symbol,
    symbolSize: 7,
    itemStyle: { color: palette.surface, borderColor: look.colour, borderWidth: 1.5 },
  };
  return [line, markers];
}

function limitSeries({ name, line }: SpectrumLimit, { range, levels, palette }: SpectrumScene) {
  const points = line.segments.flatMap(({ fromHz, toHz, fromDbuv, toDbuv }) => [
    [fromHz / 1e6, fromDbuv],
    [toHz / 1e6, toDbuv],
  ]);
  const nameHz = Math.min(range.toHz, line.segments[line.segments.length - 1].toHz);
  const nameDbuv = limitAt(line, nameHz);
  const drawn = {
    type: 'line',
    data: points,
    silent: true,
    showSymbol: false,
    z: 6,
    lineStyle: { color: palette.limit, width: 2.4 },
  };
  if (nameDbuv === null || nameDbuv > levels.toDbuv || nameHz <= range.fromHz) return [drawn];
  const written = {
    type: 'scatter',
    data: [[nameHz / 1e6, nameDbuv]],
    silent: true,
    z: 7,
    symbolSize: 0.1,
    label: {
      show: true,
      formatter: name,
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
  return [drawn, written];
}

/** Grid lines at the ticks, harmonics (dashed) and pins (accent) as vertical lines. */
function verticals({ marks, pinsHz, range, palette }: SpectrumScene) {
  const inView = (frequencyHz: number) => frequencyHz >= range.fromHz && frequencyHz <= range.toHz;
  const label = { show: true, position: 'end', distance: 4, fontSize: 12, fontFamily: CHART_FONT };
  return {
    symbol: 'none',
    silent: true,
    animation: false,
    data: [
      ...frequencyTicksHz(range).map((tickHz) => ({
        xAxis: tickHz / 1e6,
        label: { show: false },
        lineStyle: { color: palette.hairline, width: 1, type: 'solid' },
      })),
      ...marks
        .filter(({ frequencyHz }) => inView(frequencyHz))
        .map((mark) => ({
          xAxis: mark.frequencyHz / 1e6,
          label: { ...label, formatter: mark.label, color: palette.inkMuted },
          lineStyle: { color: palette.inkMuted, width: 1, type: [3, 4] },
        })),
      ...pinsHz.filter(inView).map((pinHz) => ({
        xAxis: pinHz / 1e6,
        label: { ...label, formatter: String(pinsHz.indexOf(pinHz) + 1), color: palette.accent, fontWeight: 700 },
        lineStyle: { color: palette.accent, width: 1.5, type: 'solid' },
      })),
    ],
  };
}
