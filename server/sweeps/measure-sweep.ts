import type { SweepTags } from '@shared/contracts/sweeps';
import type { GridDescription } from '@shared/traces/frequency-grid';
import { sweepMargins } from '@shared/traces/margins';
import type { FoundProduct } from '../products/find-product';
import { sha256 } from './original-files';
import { packTrace } from './pack-trace';
import { type KnownGrid, knownGrid, type PlannedLine, plannedLine } from './prepared-grids';
import { readSweepFile, type SweepReading } from './read-sweep-file';
import type { NewSweep } from './sweep-store';
import type { StoredTrace } from './trace-store';

/** Columns of a sweep that follow from its levels and the product's limit plan. */
export type MarginColumns = Pick<
  NewSweep,
  | 'limitSetKey'
  | 'limitSetVersion'
  | 'worstMarginDb'
  | 'worstFrequencyHz'
  | 'worstLevelDbuv'
  | 'worstLimitDbuv'
  | 'bands'
  | 'cells'
>;

export interface MeasuredSweep extends SweepReading {
  gridHash: string;
  grid: GridDescription;
  readingHash: string;
  margins: MarginColumns;
  packed: Pick<StoredTrace, 'encoding' | 'levels'>;
}

/** Reads the file and works out everything about the sweep that needs no database. */
export function measureSweep(bytes: Uint8Array, tags: SweepTags, { product, team }: FoundProduct): MeasuredSweep {
  const { reading, trace } = readSweepFile(bytes, tags);
  const { frequenciesHz } = reading;
  const gridHash = sha256(bytesOf(frequenciesHz));
  const planned = plannedLine(product.limitSetKey, tags.detector);
  const grid = knownGrid(gridHash, frequenciesHz, planned, team.bands);
  return {
    reading,
    trace,
    gridHash,
    grid: grid.description,
    readingHash: sha256(bytesOf(trace.levelsDbuv)),
    margins: marginColumns(trace.levelsDbuv, planned, grid),
    packed: packTrace(trace.levelsDbuv),
  };
}

/** Margins of levels against the planned line of their product. */
export function marginColumns(levelsDbuv: Float32Array, { set }: PlannedLine, grid: KnownGrid): MarginColumns {
  const { worst, bands, cells } = sweepMargins(levelsDbuv, grid);
  return {
    limitSetKey: set.key,
    limitSetVersion: set.version,
    worstMarginDb: worst?.marginDb ?? null,
    worstFrequencyHz: worst?.frequencyHz ?? null,
    worstLevelDbuv: worst?.levelDbuv ?? null,
    worstLimitDbuv: worst?.limitDbuv ?? null,
    bands,
    cells: bytesOf(cells),
  };
}

export function bytesOf({ buffer, byteOffset, byteLength }: Float64Array | Float32Array | Int16Array): Buffer {
  return Buffer.from(buffer, byteOffset, byteLength);
}
