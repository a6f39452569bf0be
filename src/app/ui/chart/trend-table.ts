import { formatDecibels } from '@shared/units/format-decibels';
import { formatFrequency } from '@shared/units/format-frequency';
import { CHIP_LOOKS } from '../chip-looks';
import { formatTime } from '../format-time';
import { buildLabel } from './build-axis';
import type { BuildRange } from './build-range';
import type { ChartTable } from './chart-table';
import type { TrendBuild, TrendSeries } from './trend-types';

/** One row a build, newest first, with the worst margin and its frequency for every series. */
export function trendTable(
  builds: readonly TrendBuild[],
  series: readonly TrendSeries[],
  { from, to }: BuildRange,
  timeZone: string,
): ChartTable {
  const rows = builds.slice(from, to).map((build, i) => [
    buildLabel(build),
    formatTime(build.builtAt, timeZone, 'day'),
    build.isReference ? 'reference' : CHIP_LOOKS[build.verdict ?? 'unjudged'].word,
    ...series.flatMap(({ points }) => {
      const point = points[from + i];
      if (!point) return ['not measured', ''];
      return [formatDecibels(point.marginDb), point.frequencyHz === null ? '' : formatFrequency(point.frequencyHz)];
    }),
    String(build.openDrops),
  ]);
  return {
    caption: `Worst margin of ${rows.length} builds, newest first`,
    columns: [
      { label: 'Build' },
      { label: 'Date' },
      { label: 'Verdict' },
      ...series.flatMap(({ label }) => [
        { label, isNumber: true },
        { label: 'at', isNumber: true },
      ]),
      { label: 'Open drops', isNumber: true },
    ],
    rows: rows.reverse(),
  };
}
