/**
 * The least of several margins, passing over what was not measured.
 * @returns dB, or null when nothing was measured: no margin is never a good one
 * Example: [4.2, null, 6.1] gives 4.2.
 */
export function worstMarginDb(marginsDb: readonly (number | null)[]): number | null {
  const measured = marginsDb.filter((marginDb) => marginDb !== null);
  return measured.length > 0 ? Math.min(...measured) : null;
}
