/** Room around the plot for axes and names, px. Fixed, so that pointer positions map to values without the drawing library. */
export interface PlotMargins {
  left: number;
  right: number;
  top: number;
  bottom: number;
}

/** A place in the plot: 0 to 1 from its left and from its top edge. */
export interface PlotPoint {
  xFraction: number;
  yFraction: number;
}

/** A stretch of the plot's width, 0 to 1 from its left edge. */
export interface PlotRange {
  fromFraction: number;
  toFraction: number;
}

/** Where a fraction of the plot lies in the chart, px from the chart's edge. */
export function atFraction(fraction: number, sizePx: number, before: number, after: number): number {
  return before + fraction * (sizePx - before - after);
}
