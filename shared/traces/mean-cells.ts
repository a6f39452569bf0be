import { CELL_NOT_MEASURED } from '../limits/cells';

/**
 * Averages margin vectors cell by cell.
 * Formula: round(sum of the cell over the vectors / number of vectors).
 * @param vectors worst margin a cell, centi-dB, CELL_NOT_MEASURED where there is none; at least one, equally long
 * @returns means in centi-dB; a cell that one vector did not measure is not measured, so that every mean is over all
 * @throws RangeError without a vector, or with vectors of unlike length
 * Source: mean in dB, as margins are averaged over runs everywhere.
 * Example: [100, 250] and [200, CELL_NOT_MEASURED] give [150, CELL_NOT_MEASURED].
 */
export function meanCells(vectors: readonly Int16Array[]): Int16Array {
  if (vectors.length === 0) throw new RangeError('a mean needs at least one cell vector');
  const length = vectors[0].length;
  if (vectors.some((vector) => vector.length !== length)) throw new RangeError('cell vectors must be equally long');
  const means = new Int16Array(length);
  for (let cell = 0; cell < length; cell++) {
    const isMeasured = vectors.every((vector) => vector[cell] !== CELL_NOT_MEASURED);
    const sum = vectors.reduce((total, vector) => total + vector[cell], 0);
    means[cell] = isMeasured ? Math.round(sum / vectors.length) : CELL_NOT_MEASURED;
  }
  return means;
}
