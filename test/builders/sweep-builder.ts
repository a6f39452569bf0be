import { SweepTags, type SweepTagsInput } from '@shared/contracts/sweeps';
import { firstIndexAtOrAbove } from '@shared/traces/frequency-grid';
import { eq } from 'drizzle-orm';
import type { Actor } from '../../server/actor';
import type { Bench } from '../../server/benches/find-bench';
import { findOrCreateBuild } from '../../server/builds/find-or-create-build';
import type { Context } from '../../server/context';
import { teams } from '../../server/db/schema';
import { rollUpBuild } from '../../server/margins/roll-up-build';
import { findOrCreateState } from '../../server/products/find-or-create-state';
import { findOrCreateUnit } from '../../server/products/find-or-create-unit';
import type { Product } from '../../server/products/product-store';
import { type ImportedSweep, importSweep } from '../../server/sweeps/import-sweep';
import { bytesOf, marginColumns } from '../../server/sweeps/measure-sweep';
import { sha256 } from '../../server/sweeps/original-files';
import { packTrace } from '../../server/sweeps/pack-trace';
import { knownGrid, plannedLine } from '../../server/sweeps/prepared-grids';
import { insertSweep } from '../../server/sweeps/sweep-store';
import { findGridId, insertGrid, insertTrace } from '../../server/sweeps/trace-store';

const JOB: Actor = { kind: 'job', name: 'builder' };
let serial = 0;

/** A made-up trace: a floor with a ripple that is new every time, and single lines on points of the grid. */
export interface TraceShape {
  floorDbuv?: number;
  /** Lines: frequency in Hz, level in dBuV. Each stands alone, so that its top is that very point. */
  peaks?: readonly (readonly [frequencyHz: number, levelDbuv: number])[];
  frequenciesHz?: Float64Array;
  /** Makes the ripple; give it where two traces must have the same numbers. */
  seed?: number;
}

/** 150 kHz to 30 MHz in steps of 4.5 kHz: 6,634 points, the grid of a 9 kHz receiver. */
export function receiverGrid(stepHz = 4_500): Float64Array {
  return Float64Array.from({ length: Math.floor((30e6 - 150e3) / stepHz) + 1 }, (_, i) => 150e3 + i * stepHz);
}

const GRID = receiverGrid();

/** Levels in hundredths of a dBuV. */
export function buildLevels(shape: TraceShape = {}): Float32Array {
  const { floorDbuv = 12, peaks = [[159_000, 50]], frequenciesHz = GRID, seed = (serial += 1) } = shape;
  let state = seed * 2_654_435_761;
  const levels = Float32Array.from(frequenciesHz, () => {
    state = (Math.imul(state, 1_664_525) + 1_013_904_223) >>> 0;
    return Math.round((floorDbuv + state / 2 ** 32) * 100) / 100;
  });
  for (const [frequencyHz, levelDbuv] of peaks) {
    const index = firstIndexAtOrAbove(frequenciesHz, frequencyHz);
    if (index > 0) levels[index - 1] = floorDbuv;
    if (index + 1 < levels.length) levels[index + 1] = floorDbuv;
    levels[index] = levelDbuv;
  }
  return levels;
}

/** A file as a receiver writes it. */
export function buildSweepFile(shape: TraceShape = {}, heading = 'Frequency [Hz];Level [dBuV]'): Buffer {
  const frequenciesHz = shape.frequenciesHz ?? GRID;
  const levels = buildLevels(shape);
  const rows = Array.from(levels, (level, i) => `${frequenciesHz[i]};${level.toFixed(2)}`);
  return Buffer.from(`${heading}\n${rows.join('\n')}\n`);
}

/** Complete tags of a product sweep; the case overrides what it is about. */
export function buildTags(product: Product, bench: Bench, override: Partial<SweepTagsInput> = {}): SweepTagsInput {
  return {
    product: product.key,
    hardware: 'C1',
    firmware: '2.4.1',
    unit: '0007',
    state: '230 V full load',
    bench: bench.key,
    line: 'L',
    detector: 'QP',
    takenAt: '2026-03-02T08:20:00Z',
    rbwHz: 9000,
    attenuationDb: 10,
    corrected: true,
    ...override,
  };
}

/** Imports a file of the shape the way a bench does. */
export function importBuiltSweep(
  context: Context,
  actor: Actor,
  tags: SweepTagsInput,
  shape: TraceShape = {},
): ImportedSweep {
  const upload = { bytes: buildSweepFile(shape), fileName: 'sweep.csv', tags: SweepTags.parse(tags) };
  return importSweep(context, actor, upload);
}

/**
 * Stores a sweep of the shape with its trace, margins and roll-up, but without a file: a tenth of the cost of an import.
 * Returns the sweep's id.
 */
export function buildSweep(
  context: Context,
  product: Product,
  bench: Bench,
  override: Partial<SweepTagsInput> = {},
  shape: TraceShape = {},
): number {
  serial += 1;
  const { db } = context;
  const tags = SweepTags.parse(buildTags(product, bench, override));
  const team = db.select().from(teams).where(eq(teams.id, product.teamId)).get();
  if (team === undefined) throw new Error(`team ${product.teamId} is gone`);
  const takenAt = tags.takenAt === undefined ? context.now() : Date.parse(tags.takenAt);
  const { hardware, firmware, switching } = tags;
  const build = findOrCreateBuild(context, JOB, product, { hardware, firmware, builtAt: takenAt, switching });
  const frequenciesHz = shape.frequenciesHz ?? GRID;
  const levels = buildLevels(shape);
  const gridHash = sha256(bytesOf(frequenciesHz));
  const planned = plannedLine(product.limitSetKey, tags.detector);
  const grid = knownGrid(gridHash, frequenciesHz, planned, team.bands);
  const sweepId = insertSweep(db, {
    teamId: team.id,
    productId: product.id,
    buildId: build.id,
    stateId: findOrCreateState(context, JOB, product, tags.state).id,
    unitId: tags.unit === undefined ? null : findOrCreateUnit(context, product, tags.unit).id,
    benchId: bench.id,
    line: tags.line,
    detector: tags.detector,
    kind: tags.kind,
    takenAt,
    run: tags.run ?? `run ${takenAt}`,
    rbwHz: tags.rbwHz ?? null,
    attenuationDb: tags.attenuationDb ?? null,
    correction: tags.corrected ? 'inFile' : 'none',
    gridId: findGridId(db, gridHash) ?? insertGrid(db, gridHash, grid.description, bytesOf(frequenciesHz)),
    originalSha256: sha256(Buffer.from(`built ${serial}`)),
    fileName: 'built.csv',
    traceNumber: 1,
    frequencyUnit: 'Hz',
    levelUnit: 'dBuV',
    identity: `built ${serial}`,
    readingHash: sha256(bytesOf(levels)),
    remarks: [],
    ...marginColumns(levels, planned, grid),
    importedAt: context.now(),
    importedByKind: 'job',
    importedById: null,
    importedByName: JOB.name,
    batchId: null,
  });
  insertTrace(db, { sweepId, ...packTrace(levels) });
  rollUpBuild(context, build.id);
  return sweepId;
}
