const LOWEST_CENTI_DB = -32767;
const HIGHEST_CENTI_DB = 32767;

/**
 * Turns a margin into whole hundredths of a decibel, never above the margin itself.
 * Formula: the largest whole n with n / 100 <= marginDb, held within +-327.67 dB.
 * @param marginDb margin in dB, any finite number
 * @returns margin in centi-dB, -32767 to 32767 (-32768 is kept free for "not measured")
 * Source: our own definition: a stored margin may be too small by 0.01 dB, but never too large.
 * Example: 3.219 dB gives 321; -0.001 dB gives -1.
 */
export function marginToCentiDb(marginDb: number): number {
  const nearest = Math.round(marginDb * 100);
  // Comparing after the division gives a margin of two decimals back as written: 0.29 * 100 is 28.999999999999996.
  const centiDb = nearest / 100 <= marginDb ? nearest : nearest - 1;
  return Math.min(HIGHEST_CENTI_DB, Math.max(LOWEST_CENTI_DB, centiDb));
}

/**
 * Turns hundredths of a decibel back into decibels.
 * @param centiDb level or margin in centi-dB
 * @returns the same in dB
 * Example: 321 gives 3.21 dB.
 */
export function centiDbToDb(centiDb: number): number {
  return centiDb / 100;
}
