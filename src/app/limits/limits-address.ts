import type { LimitSetView } from '@shared/contracts/limits';

const FIRST_READ_HZ = 150_000;

/** The sets that an address names, in their own order; all of them when it names none at all. */
export function chosenSets(sets: readonly LimitSetView[], address: string | undefined): LimitSetView[] {
  if (address === undefined) return [...sets];
  const keys = address.split(',');
  return sets.filter(({ key }) => keys.includes(key));
}

/** Where limits are read, Hz: what the address says, else the lower end of conducted emission. */
export function readAtHz(address: string | undefined): number {
  const frequencyHz = Number(address);
  return Number.isFinite(frequencyHz) && frequencyHz > 0 ? frequencyHz : FIRST_READ_HZ;
}
