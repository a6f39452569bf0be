import { CELL_NOT_MEASURED } from '@shared/limits/cells';
import { centiDbToDb } from '@shared/units/centi-decibels';
import { formatDecibels, formatSignedDecibels } from '@shared/units/format-decibels';
import { median } from 'simple-statistics';
import type { GuardHit } from './guard-hit';

/** Fewer cells than this, about half a decade, do not show a curve. Our own definition. */
const LEAST_CELLS = 12;
const LEAST_OFFSET_DB = 1;
/** Scatter of a difference that is the chain's alone; a large offset may scatter by 8 % of itself, since two single runs of
 * 0.5 dB each already scatter by 0.48 dB. */
const LEAST_SCATTER_DB = 0.3;
const SCATTER_SHARE = 0.08;
/** Attenuators and limiters come in these values, dB; within 0.5 dB of one it is named. */
const USUAL_STEPS_DB = [3, 6, 10, 20];
const NEAR_DB = 0.5;

export interface ConstantOffset {
  /** Median over cells of the build's margin less the reference's, dB; negative = every level rose. */
  readonly medianDb: number;
  /** Median absolute deviation from it, dB, unscaled. */
  readonly madDb: number;
  readonly cells: number;
  /** 3, 6, 10 or 20 when within 0.5 dB of it. */
  readonly nearDb: number | null;
}

/**
 * Finds a difference that is the same over the whole range: a limiter or attenuator left out or entered twice, not a product.
 * Formula: |median| > 1 dB with MAD < max(0.3 dB, 0.08 |median|), over cells measured on both sides.
 * @param buildCells worst margin a cell, centi-dB, Int16, `CELL_NOT_MEASURED` where there is none
 * @param referenceCells the same cells of the reference
 * @returns the offset, or null where the difference is small, not constant, or seen in fewer than 12 cells
 * Throws RangeError on vectors of unlike length.
 * Source: our own definition; a product changes single harmonics or slopes, an attenuator everything alike.
 * Example: 57 cells, all 10.0 dB lower than before: -10 dB, near 10 dB.
 */
export function findConstantOffset(buildCells: Int16Array, referenceCells: Int16Array): ConstantOffset | null {
  if (buildCells.length !== referenceCells.length) {
    throw new RangeError(`cell vectors must be equally long, not ${buildCells.length} and ${referenceCells.length}`);
  }
  const differencesDb: number[] = [];
  buildCells.forEach((build, cell) => {
    const reference = referenceCells[cell];
    if (build !== CELL_NOT_MEASURED && reference !== CELL_NOT_MEASURED) {
      differencesDb.push(centiDbToDb(build - reference));
    }
  });
  if (differencesDb.length < LEAST_CELLS) return null;
  const medianDb = median(differencesDb);
  const madDb = median(differencesDb.map((differenceDb) => Math.abs(differenceDb - medianDb)));
  const sizeDb = Math.abs(medianDb);
  if (sizeDb <= LEAST_OFFSET_DB || madDb >= Math.max(LEAST_SCATTER_DB, SCATTER_SHARE * sizeDb)) return null;
  const nearDb = USUAL_STEPS_DB.find((stepDb) => Math.abs(sizeDb - stepDb) <= NEAR_DB) ?? null;
  return { medianDb, madDb, cells: differencesDb.length, nearDb };
}

/** The offset as a sign that the bench moved. */
export function constantOffsetHit({ medianDb, madDb, cells, nearDb }: ConstantOffset): GuardHit {
  const likely = nearDb === null ? '' : `, as an attenuator or limiter of ${nearDb} dB would`;
  const scatter = `within ${formatDecibels(madDb)} at half of ${cells} cells`;
  return {
    code: 'constantOffset',
    text: `the whole curve moved by ${formatSignedDecibels(medianDb)} (${scatter})${likely}`,
  };
}
