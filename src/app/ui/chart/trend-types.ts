import type { AxisBuild } from './build-axis';

export interface TrendBuild extends AxisBuild {
  openDrops: number;
}

/** One line of the trend, such as a band or an operating state. */
export interface TrendSeries {
  id: string;
  label: string;
  /** One a build, in the order of the builds; null where nothing was measured. */
  points: readonly (TrendPoint | null)[];
}

export interface TrendPoint {
  /** Worst margin, dB. */
  marginDb: number;
  frequencyHz: number | null;
  runs: number;
  /** Lowest and highest worst margin over the runs, dB; null for a single run. */
  lowestDb: number | null;
  highestDb: number | null;
}
