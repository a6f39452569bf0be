import { mkdirSync } from 'node:fs';
import { join } from 'node:path';
import { SweepTags } from '@shared/contracts/sweeps';
import { sweepMargins } from '@shared/traces/margins';
import { readDelimited } from '@shared/traces/read-delimited';
import SqliteDatabase from 'better-sqlite3';
import { withTransaction } from '../../server/db/with-transaction';
import { importSweep } from '../../server/sweeps/import-sweep';
import { bytesOf } from '../../server/sweeps/measure-sweep';
import { OriginalFiles, sha256 } from '../../server/sweeps/original-files';
import { packTrace } from '../../server/sweeps/pack-trace';
import { knownGrid, plannedLine } from '../../server/sweeps/prepared-grids';
import { type BenchContext, openBenchContext } from './bench-context';
import { type Measured, measureRounds } from './measure-rounds';
import { syntheticTags } from './synthetic-sweep';

/** Files a round. */
const BLOCK = 100;
/** How many share a transaction where several do. */
const TOGETHER = 20;

export interface IngestStages {
  /** SHA-256 of the file, which an import that knows duplicates needs. */
  hash: Measured;
  parse: Measured;
  /** Hashes of grid and levels, margins of bands and cells on a prepared grid. */
  margins: Measured;
  pack: Measured;
  /** The original, compressed and written. */
  keep: Measured;
  /** The whole verb, one transaction a sweep, and 20 in one. */
  importOneEach: Measured;
  importTogether: Measured;
  /** Floors: Float32 levels as one BLOB, one transaction each, and 20 in one. */
  insertOneEach: Measured;
  insertTogether: Measured;
}

/** Measures the parts of an import, the whole and its floors in the same rounds. */
export function measureStages(files: readonly Buffer[]): IngestStages {
  const context = openBenchContext();
  // One of its own: a file that the other had kept already would cost it nothing.
  const together = openBenchContext();
  const originals = new OriginalFiles(join(context.folder, 'kept'));
  const rounds = Math.floor(files.length / BLOCK) - 1;
  const reading = readDelimited(files[0] ?? Buffer.alloc(0));
  const { frequenciesHz } = reading;
  const levels = reading.traces[0]?.levelsDbuv ?? new Float32Array();
  const planned = plannedLine('CISPR32_B', 'QP');
  const raw = openRaw(join(context.folder, 'raw.db'));
  const blob = bytesOf(levels);

  /** Every candidate walks through the files on its own, so that each sees every file once. */
  const blocks = (work: (block: readonly Buffer[], first: number) => void) => {
    let next = 0;
    return () => {
      const first = (next++ % (rounds + 1)) * BLOCK;
      work(files.slice(first, first + BLOCK), first);
    };
  };
  const each = (work: (file: Buffer) => void) => blocks((block) => block.forEach(work));
  const importInto = (into: BenchContext) => (block: readonly Buffer[], first: number) =>
    block.forEach((bytes, index) => {
      const tags = SweepTags.parse(syntheticTags(first + index));
      importSweep(into, into.actor, { bytes, fileName: 'sweep.csv', tags });
    });
  const importInOne = importInto(together);

  const candidates = {
    hash: each((file) => void sha256(file)),
    parse: each((file) => void readDelimited(file)),
    margins: each(() => {
      const gridHash = sha256(bytesOf(frequenciesHz));
      sha256(bytesOf(levels));
      sweepMargins(levels, knownGrid(gridHash, frequenciesHz, planned, []));
    }),
    pack: each(() => void packTrace(levels)),
    keep: each((file) => void originals.keep(file)),
    importOneEach: blocks(importInto(context)),
    importTogether: blocks((block, first) =>
      inGroups(block, (group, offset) => withTransaction(together.db, () => importInOne(group, first + offset))),
    ),
    insertOneEach: each(() => void raw.insert.run(blob)),
    insertTogether: blocks((block) =>
      inGroups(block, (group) => raw.together(() => group.forEach(() => raw.insert.run(blob)))),
    ),
  };
  const measured = measureRounds(
    Object.entries(candidates).map(([name, run]) => ({ name, units: BLOCK, run })),
    rounds,
  );
  raw.close();
  together.close();
  context.close();
  return Object.fromEntries(measured.map((one) => [one.name, one])) as unknown as IngestStages;
}

function inGroups(block: readonly Buffer[], work: (group: readonly Buffer[], offset: number) => void): void {
  for (let offset = 0; offset < block.length; offset += TOGETHER) work(block.slice(offset, offset + TOGETHER), offset);
}

function openRaw(file: string) {
  mkdirSync(join(file, '..'), { recursive: true });
  const client = new SqliteDatabase(file);
  client.pragma('journal_mode = WAL');
  client.pragma('synchronous = NORMAL');
  client.exec('create table levels (id integer primary key, levels blob not null)');
  const insert = client.prepare('insert into levels (levels) values (?)');
  return { insert, together: client.transaction((work: () => void) => work()), close: () => client.close() };
}
