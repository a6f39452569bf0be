import type { SweepTags } from '@shared/contracts/sweeps';
import { describeGrid, type GridDescription } from '@shared/traces/frequency-grid';
import { sweepMargins } from '@shared/traces/margins';
import type { FoundProduct } from '../products/find-product';
import { sha256 } from './original-files';
import { packTrace } from './pack-trace';
import { plannedLine, preparedGrid } from './prepared-grids';
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
export function measureSweep(bytes: Uint8Array, tags: SweepTags, found: FoundProduct): MeasuredSweep {
  const { reading, trace } = readSweepFile(bytes, tags);
  const { frequenciesHz } = reading;
  const gridHash = sha256(bytesOf(frequenciesHz));
  return {
    reading,
    trace,
    gridHash,
    grid: describeGrid(frequenciesHz),
    readingHash: sha256(bytesOf(trace.levelsDbuv)),
    margins: marginColumns(gridHash, frequenciesHz, trace.levelsDbuv, tags, found),
    packed: packTrace(trace.levelsDbuv),
  };
}

/** Margins of levels against the limit plan of their product. */
export function marginColumns(
  gridHash: string,
  frequenciesHz: Float64Array,
  levelsDbuv: Float32Array,
  { detector }: Pick<SweepTags, 'detector'>,
  { product, team }: FoundProduct,
): MarginColumns {
  const planned = plannedLine(product.limitSetKey, detector);
  const { worst, bands, cells } = sweepMargins(levelsDbuv, preparedGrid(gridHash, frequenciesHz, planned, team.bands));
  return {
    limitSetKey: planned.set.key,
    limitSetVersion: planned.set.version,
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
