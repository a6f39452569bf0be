import { isLineNotStep } from '@shared/statistics/step-or-line';
import { theilSenSlope } from '@shared/statistics/theil-sen';
import { cusumLoss, type BuildMargin, type CusumLoss } from './cusum-loss';

/** Beyond this a straight line says nothing about builds to come. Our own definition. */
const FARTHEST_BUILDS = 100;

/** A loss smaller than this over the whole series is no news, however certain. Our own definition: half the usual threshold. */
const LEAST_LOSS_DB = 1;
/** Fewer builds show no line. Our own definition. */
const LEAST_BUILDS = 6;

export interface Creep extends CusumLoss {
  /** dB per build; negative = margin is being lost. */
  readonly slopeDbPerBuild: number;
  /** 90 % interval of the slope. */
  readonly slopeInterval: readonly [number, number];
  /** Builds after the last one until the straight line reaches the target margin; 0 when it is there; null when it never does. */
  readonly buildsToTarget: number | null;
}

/** Builds until a line through the median point with this slope falls to the target. */
function buildsToTarget(marginsDb: readonly number[], slope: number, targetMarginDb: number): number | null {
  const last = marginsDb.length - 1;
  const atLast = marginsDb.map((marginDb, index) => marginDb + slope * (last - index)).sort((a, b) => a - b);
  const lineDb = (atLast[Math.floor(last / 2)] + atLast[Math.ceil(last / 2)]) / 2;
  if (lineDb <= targetMarginDb) return 0;
  if (slope >= 0) return null;
  const builds = Math.ceil((targetMarginDb - lineDb) / slope);
  return builds <= FARTHEST_BUILDS ? builds : null;
}

/**
 * Finds a creeping loss of margin in a series and says how fast it goes.
 * A creep is a CUSUM signal whose slope is certainly negative (90 % interval), that lost at least 1 dB along the line, and
 * that a single step does not fit better: a step is a drop, and looks like a trend to every test of trend.
 * @param series mean margins, dB, in build order, without a judged step in between
 * @param referenceMeanDb mean margin of the reference, dB
 * @param sdDb s_I, dB, above 0
 * @param targetMarginDb dB
 * @returns the creep, or null
 * Throws RangeError on a spread of 0 or less.
 * Source: CUSUM for whether (Page 1954), Theil-Sen for how fast (Sen 1968); the line is extended by our own definition.
 * Example: 10 dB falling by 0.3 dB a build over 15 builds, s_I 0.7 dB, target 4 dB: -0.3 dB per build, 6 builds left.
 */
export function findCreep(
  series: readonly BuildMargin[],
  referenceMeanDb: number,
  sdDb: number,
  targetMarginDb: number,
): Creep | null {
  const loss = cusumLoss(series, referenceMeanDb, sdDb);
  if (!loss || series.length < LEAST_BUILDS) return null;
  const marginsDb = series.map(({ marginDb }) => marginDb);
  const { slope, interval } = theilSenSlope(
    series.map((_, index) => index),
    marginsDb,
  );
  const lostDb = -slope * (series.length - 1);
  if (interval[1] >= 0 || lostDb < LEAST_LOSS_DB || !isLineNotStep(marginsDb)) return null;
  return {
    ...loss,
    slopeDbPerBuild: slope,
    slopeInterval: interval,
    buildsToTarget: buildsToTarget(marginsDb, slope, targetMarginDb),
  };
}
