import type { TrendView } from '@shared/contracts/margins';
import type { TrendBuild, TrendSeries } from '../../ui/chart/trend-types';

/** The builds along the axis of a trend, oldest first. */
export function trendBuilds({ points, referenceBuildId }: TrendView): TrendBuild[] {
  return points.map(({ buildId, hardware, firmware, builtAt, verdict, openDrops }) => ({
    id: buildId,
    hardware,
    firmware,
    builtAt,
    verdict,
    openDrops,
    isReference: buildId === referenceBuildId,
  }));
}

/** One line of a trend, build by build in the order of `builds`; a build that came in between two answers is a gap. */
export function trendSeries(label: string, view: TrendView, builds: readonly TrendBuild[]): TrendSeries {
  const points = new Map(view.points.map((point) => [point.buildId, point]));
  return {
    id: label,
    label,
    points: builds.map(({ id }) => {
      const point = points.get(id);
      if (point === undefined || point.worstMarginDb === null) return null;
      const isSingle = point.runs < 2;
      return {
        marginDb: point.worstMarginDb,
        frequencyHz: point.worstFrequencyHz,
        runs: point.runs,
        lowestDb: isSingle ? null : point.lowestDb,
        highestDb: isSingle ? null : point.highestDb,
      };
    }),
  };
}
