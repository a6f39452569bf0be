interface Spot {
  x: number;
  y: number;
}

export interface SparklineShape {
  /** One path for each run of measured builds. */
  paths: string[];
  /** Measured builds without a measured neighbour, which no path shows. */
  dots: Spot[];
  last: (Spot & { isOver: boolean }) | null;
  limitY: number;
  targetY: number | null;
}

const EDGE = 3;

/** Lays margins out in a box of `width` x `height` px. The limit (0 dB) and the target are always inside the picture. */
export function sparklineShape(
  marginsDb: readonly (number | null)[],
  targetMarginDb: number | null,
  width: number,
  height: number,
): SparklineShape {
  const measured = marginsDb.filter((marginDb) => marginDb !== null);
  const lowestDb = Math.min(0, ...measured);
  const highestDb = Math.max(3, targetMarginDb ?? 0, ...measured);
  const y = (marginDb: number): number =>
    tenth(height - EDGE - ((marginDb - lowestDb) / (highestDb - lowestDb)) * (height - 2 * EDGE));
  const step = (width - 2 * EDGE) / Math.max(1, marginsDb.length - 1);

  const runs: Spot[][] = [];
  let run: Spot[] | null = null;
  marginsDb.forEach((marginDb, build) => {
    if (marginDb === null) {
      run = null;
      return;
    }
    if (run === null) runs.push((run = []));
    run.push({ x: tenth(EDGE + build * step), y: y(marginDb) });
  });

  const lastSpot = runs.at(-1)?.at(-1);
  const lastDb = measured.at(-1);
  return {
    paths: runs.filter((spots) => spots.length > 1).map((spots) => `M${spots.map((s) => `${s.x} ${s.y}`).join(' L')}`),
    dots: runs.filter((spots) => spots.length === 1).map((spots) => spots[0]),
    last: lastSpot && lastDb !== undefined ? { ...lastSpot, isOver: lastDb < 0 } : null,
    limitY: y(0),
    targetY: targetMarginDb === null ? null : y(targetMarginDb),
  };
}

function tenth(length: number): number {
  return Math.round(length * 10) / 10;
}
