import { linearRegression, linearRegressionLine, mean, sum } from 'simple-statistics';

export interface Split {
  /** Number of values before the step. */
  readonly at: number;
  /** Sum of squared errors about the two means. */
  readonly squaredError: number;
}

function squaredErrorOfMean(values: readonly number[]): number {
  const centre = mean([...values]);
  return sum(values.map((value) => (value - centre) ** 2));
}

/**
 * The one step that fits a series best.
 * Formula: the split k that minimises the sum of squared errors about the means of the first k and of the other values.
 * @param series in order, any unit, at least two values
 * @returns the split and its squared error
 * Throws RangeError on fewer than two values.
 * Source: least squares with one change of mean, as in Killick et al., JASA 107 (2012) 1590-1598, section 2.
 * Example: 5, 5, 2, 2 splits after 2 values with no error.
 */
export function bestSplit(series: readonly number[]): Split {
  if (series.length < 2) throw new RangeError(`a split needs at least two values, not ${series.length}`);
  let best: Split = { at: 0, squaredError: Infinity };
  for (let at = 1; at < series.length; at++) {
    const squaredError = squaredErrorOfMean(series.slice(0, at)) + squaredErrorOfMean(series.slice(at));
    if (squaredError < best.squaredError) best = { at, squaredError };
  }
  return best;
}

/**
 * Whether a series falls or rises along a line rather than in one step; a step looks like a trend to every test of trend.
 * Formula: squared error about the least-squares line less than that about the best split. The split has the freer fit (its
 * place is chosen too), so that in doubt the answer is a step.
 * @param series in order, any unit, at least three values
 * @returns true for a line
 * Throws RangeError on fewer than three values.
 * Source: our own definition, on least squares.
 * Example: 10, 9.7, 9.4, 9.1, 8.8 is a line; 10, 10, 8, 8, 8 is a step.
 */
export function isLineNotStep(series: readonly number[]): boolean {
  if (series.length < 3) throw new RangeError(`a line needs at least three values, not ${series.length}`);
  const points = series.map((value, index) => [index, value]);
  const lineAt = linearRegressionLine(linearRegression(points));
  const lineError = sum(points.map(([index, value]) => (value - lineAt(index)) ** 2));
  return lineError < bestSplit(series).squaredError;
}
