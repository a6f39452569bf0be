import { decimate } from '@shared/traces/decimate';
import type { EChartsCoreOption } from 'echarts/core';
import { axisLook, frequencyAxis } from './axis-look';
import { limitSeries } from './limit-series';
import type { PlotMargins } from './plot-margins';
import { peakMarkers } from './peak-markers';
import type { SpectrumScene } from './spectrum-scene';
import { spectrumVerticals } from './spectrum-verticals';
import type { SpectrumTrace } from './spectrum-types';
import type { TraceLook } from './trace-look';

/** Room above the plot for the numbers of pins and, where there are harmonics, for a row with their names. */
export function spectrumMargins(hasMarks: boolean): PlotMargins {
  return { left: 56, right: 16, top: hasMarks ? 38 : 22, bottom: 44 };
}

/** The drawing library's description of a spectrum: background, traces, limit lines with their names, pins. */
export function spectrumOption(scene: SpectrumScene): EChartsCoreOption {
  const { traces, looks, limits, range, levels, palette } = scene;
  const look = axisLook(palette);
  return {
    animation: false,
    grid: { ...spectrumMargins(scene.marks.length > 0), containLabel: false, outerBoundsMode: 'none' },
    xAxis: frequencyAxis(range, palette),
    yAxis: {
      ...look,
      type: 'value',
      min: levels.fromDbuv,
      max: levels.toDbuv,
      interval: 10,
      name: 'dBµV',
      nameLocation: 'middle',
      nameGap: 34,
    },
    series: [
      { type: 'line', data: [], silent: true, z: 1, markLine: spectrumVerticals(scene) },
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
