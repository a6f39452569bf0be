import { DBMV_TO_DBUV, DBM_TO_DBUV_50_OHM } from './decibels';

export const LEVEL_UNITS = ['dBuV', 'dBm', 'dBmV'] as const;
export type LevelUnit = (typeof LEVEL_UNITS)[number];

/** What is added to a level in the unit to have it in dBuV at a 50 ohm input. */
export const LEVEL_OFFSET_TO_DBUV: Readonly<Record<LevelUnit, number>> = {
  dBuV: 0,
  dBm: DBM_TO_DBUV_50_OHM,
  dBmV: DBMV_TO_DBUV,
};
