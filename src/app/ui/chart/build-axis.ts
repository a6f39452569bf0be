import type { Verdict } from '@shared/judging/verdict';
import { axisLook, CHART_FONT } from './axis-look';
import type { BuildRange } from './build-range';
import type { ChartPalette } from './chart-palette';
import { verdictSymbol } from './verdict-symbols';

/** A build on the axis that trend and margin map share, oldest first. */
export interface AxisBuild {
  id: number;
  hardware: string;
  firmware: string;
  /** ISO 8601. */
  builtAt: string;
  verdict: Verdict | null;
  isReference: boolean;
}

/** Same margins above and below each other keep the builds of trend and map in line. */
export const BUILD_AXIS_MARGINS = { left: 56, right: 16 } as const;
export const STRIP_TOP_PX = 26;
const LABEL_WIDTH_PX = 68;

export function buildLabel({ hardware, firmware }: Pick<AxisBuild, 'hardware' | 'firmware'>): string {
  return `${hardware} / ${firmware}`;
}

/** Axis of builds with as many two-line labels (hardware over firmware) as fit. */
export function buildAxis(
  builds: readonly AxisBuild[],
  { from, to }: BuildRange,
  plotPx: number,
  palette: ChartPalette,
) {
  const look = axisLook(palette);
  const every = Math.max(1, Math.ceil(((to - from) * LABEL_WIDTH_PX) / plotPx));
  const labelled = Array.from({ length: Math.ceil((to - from) / every) }, (_, i) => from + i * every + 0.5);
  return {
    ...look,
    type: 'value',
    min: from,
    max: to,
    axisTick: { ...look.axisTick, customValues: labelled },
    axisLabel: {
      ...look.axisLabel,
      customValues: labelled,
      width: Math.max(LABEL_WIDTH_PX, (every * plotPx) / (to - from)) - 6,
      overflow: 'truncate',
      lineHeight: 15,
      formatter: (at: number) => {
        const build = builds[Math.floor(at)];
        return build ? `${build.hardware}\n${build.firmware}` : '';
      },
    },
    splitLine: { show: false },
  };
}

/** Glyphs above the plot: what each build was judged, and a star over the reference build. Held builds stay quiet. */
export function buildStrip(builds: readonly AxisBuild[], { from, to }: BuildRange, top: number, palette: ChartPalette) {
  const isCrowded = to - from > 80;
  const data = builds.slice(from, to).flatMap((build, i) => {
    const symbol = build.isReference ? 'reference' : build.verdict;
    if (symbol === null || symbol === 'held' || (isCrowded && symbol === 'cannotSay')) return [];
    return [{ value: [from + i + 0.5, top], ...verdictSymbol(symbol, palette) }];
  });
  return {
    type: 'scatter',
    data,
    silent: true,
    clip: false,
    z: 8,
    symbolSize: isCrowded ? 8 : 13,
    symbolOffset: [0, -13],
  };
}

/** A vertical line over the reference build. */
export function referenceLine(builds: readonly AxisBuild[], palette: ChartPalette) {
  return builds.flatMap(({ isReference }, i) =>
    isReference
      ? [
          {
            xAxis: i + 0.5,
            lineStyle: { color: palette.reference, width: 1, type: [4, 4] },
            label: { show: false, fontFamily: CHART_FONT },
          },
        ]
      : [],
  );
}
