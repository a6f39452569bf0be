/**
 * Degrees of freedom of a variance pooled over variables that move together.
 * Formula: v (tr S)^2 / tr(S^2), S the sums of squares and products of the variables; taken from the residuals, where
 * tr(S^2) is the squared norm of R R'.
 * @param residuals one row a run, one column a variable, deviations from the mean; rows of equal length
 * @param degreesOfFreedom of one variable, v, above 0
 * @returns at least v; v times the number of variables at most
 * Throws RangeError on v of 0 or less.
 * Source: Box, Annals of Mathematical Statistics 25 (1954) 290-302, theorem 3.1; with S from few runs it comes out too low
 * (Greenhouse and Geisser 1959), which is the safe side.
 * Example: two columns that are copies of each other give v.
 */
export function effectiveDegrees(residuals: readonly (readonly number[])[], degreesOfFreedom: number): number {
  if (!(degreesOfFreedom > 0)) throw new RangeError(`degrees of freedom must be above 0, not ${degreesOfFreedom}`);
  let trace = 0;
  let squaredNorm = 0;
  residuals.forEach((row, i) => {
    for (let k = 0; k <= i; k++) {
      const other = residuals[k];
      let product = 0;
      for (let column = 0; column < row.length; column++) product += row[column] * other[column];
      squaredNorm += k === i ? product ** 2 : 2 * product ** 2;
      if (k === i) trace += product;
    }
  });
  return squaredNorm === 0 ? degreesOfFreedom : degreesOfFreedom * Math.max(1, trace ** 2 / squaredNorm);
}
