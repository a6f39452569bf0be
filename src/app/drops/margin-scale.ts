/** Margins, dB, at the two ends of a picture; the limit (0 dB) always lies between them. */
export interface MarginScale {
  fromDb: number;
  toDb: number;
}

/** A scale that holds every margin given, with air at both ends and the limit well inside. */
export function marginScale(marginsDb: readonly number[]): MarginScale {
  const fromDb = Math.min(-2, ...marginsDb.map((marginDb) => marginDb - 1.5));
  const toDb = Math.max(6, ...marginsDb.map((marginDb) => marginDb + 1.5));
  return { fromDb, toDb };
}

export function percentAt(marginDb: number, { fromDb, toDb }: MarginScale): number {
  return (100 * (marginDb - fromDb)) / (toDb - fromDb);
}
