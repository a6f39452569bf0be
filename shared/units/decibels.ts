/** dBuV of 1 mW in 50 ohm: 10 log10(50 ohm * 1e-3 W / (1e-6 V)^2). Printed by handbooks as 106.99 or 107. */
export const DBM_TO_DBUV_50_OHM = 10 * Math.log10(50 * 1e9);

/** dBuV of 1 mV: 20 log10(1000). */
export const DBMV_TO_DBUV = 60;

/**
 * Turns a power level at a 50 ohm receiver input into a voltage level.
 * Formula: dBuV = dBm + 10 log10(50 * 1e9) = dBm + 106.9897.
 * @param levelDbm power level in dBm, any finite number
 * @returns voltage level in dBuV
 * Source: definition of the decibel; the receiver input of CISPR 16-1-1 is 50 ohm.
 * Example: -63.2 dBm gives 43.79 dBuV.
 */
export function dbmToDbuv(levelDbm: number): number {
  return levelDbm + DBM_TO_DBUV_50_OHM;
}

/**
 * Turns a level over one millivolt into a level over one microvolt.
 * Formula: dBuV = dBmV + 60.
 * @param levelDbmv voltage level in dBmV, any finite number
 * @returns voltage level in dBuV
 * Source: definition of the decibel.
 * Example: 6 dBmV gives 66 dBuV.
 */
export function dbmvToDbuv(levelDbmv: number): number {
  return levelDbmv + DBMV_TO_DBUV;
}
