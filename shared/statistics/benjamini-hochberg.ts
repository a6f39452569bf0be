/**
 * Adjusts p values so that rejecting those at or below q keeps the expected share of false rejections at q.
 * Formula: with p sorted rising, adjusted p(i) = min over j >= i of min(1, m p(j) / j).
 * @param pValues any length, each 0 to 1, in any order
 * @returns adjusted p values in the same order
 * Throws RangeError on a p value outside 0 to 1.
 * Source: Benjamini and Hochberg, Journal of the Royal Statistical Society B 57 (1995) 289-300; holds under positive
 * dependence (Benjamini and Yekutieli 2001), which bands of one session have.
 * Example: [0.01, 0.04] gives [0.02, 0.04].
 */
export function adjustByBenjaminiHochberg(pValues: readonly number[]): number[] {
  for (const p of pValues) if (!(p >= 0 && p <= 1)) throw new RangeError(`a p value must lie in 0 to 1, not ${p}`);
  const fallingOrder = pValues.map((_, index) => index).sort((a, b) => pValues[b] - pValues[a]);
  const adjusted = new Array<number>(pValues.length);
  let least = 1;
  fallingOrder.forEach((index, place) => {
    const rank = pValues.length - place;
    least = Math.min(least, (pValues.length * pValues[index]) / rank);
    adjusted[index] = least;
  });
  return adjusted;
}
