import type { CustomSeriesRenderItemParams } from 'echarts/types/dist/shared';
import type { EChartsCoreOption } from 'echarts/core';
import { axisLook } from './axis-look';
import { AxisBuild, BUILD_AXIS_MARGINS, buildAxis, buildStrip, STRIP_TOP_PX } from './build-axis';
import type { BuildRange } from './build-range';
import { cellTicks } from './cell-scale';
import type { ChartPalette } from './chart-palette';
import type { PlotMargins } from './plot-margins';

export const MARGIN_MAP_MARGINS: PlotMargins = { ...BUILD_AXIS_MARGINS, top: STRIP_TOP_PX, bottom: 44 };

export interface MarginMapScene {
  builds: readonly AxisBuild[];
  edgesHz: readonly number[];
  range: BuildRange;
  picture: HTMLCanvasElement;
  plotPx: number;
  palette: ChartPalette;
}

/** The map as one picture in one custom series; the axes only say where builds and frequencies lie in it. */
export function marginMapOption({
  builds,
  edgesHz,
  range,
  picture,
  plotPx,
  palette,
}: MarginMapScene): EChartsCoreOption {
  const look = axisLook(palette);
  const cellCount = edgesHz.length - 1;
  const ticks = cellTicks(edgesHz);
  const places = ticks.map(({ at }) => at);
  return {
    animation: false,
    grid: { ...MARGIN_MAP_MARGINS, containLabel: false, outerBoundsMode: 'none' },
    xAxis: buildAxis(builds, range, plotPx, palette),
    yAxis: {
      ...look,
      type: 'value',
      min: 0,
      max: cellCount,
      axisTick: { ...look.axisTick, customValues: places },
      axisLabel: {
        ...look.axisLabel,
        customValues: places,
        formatter: (at: number) => ticks.find((tick) => Math.abs(tick.at - at) < 1e-6)?.text ?? '',
      },
      splitLine: { show: false },
    },
    series: [
      {
        type: 'custom',
        data: [0],
        silent: true,
        renderItem: ({ coordSys }: CustomSeriesRenderItemParams) => {
          const { x, y, width, height } = coordSys as unknown as DOMRect;
          return { type: 'image', silent: true, style: { image: picture, x, y, width, height } };
        },
      },
      buildStrip(builds, range, cellCount, palette),
    ],
  };
}
