import type { SweepTags } from '@shared/contracts/sweeps';
import { remarksOnBands, remarksOnSettings, type SweepRemark } from '@shared/traces/sweep-remarks';
import { type Actor, actorId } from '../actor';
import { type Bench, findBenchInUse } from '../benches/find-bench';
import { findOrCreateBuild } from '../builds/find-or-create-build';
import type { Context } from '../context';
import { withTransaction } from '../db/with-transaction';
import { markStale } from '../judging/mark-stale';
import { rollUpBuild } from '../margins/roll-up-build';
import { findOrCreateState } from '../products/find-or-create-state';
import { findOrCreateUnit } from '../products/find-or-create-unit';
import { findProduct, type FoundProduct } from '../products/find-product';
import { ServiceError } from '../service-error';
import { localDay } from './local-day';
import { bytesOf, type MeasuredSweep, measureSweep } from './measure-sweep';
import { mergeSwitching } from './merge-switching';
import { sha256 } from './original-files';
import { sweepIdentity } from './sweep-identity';
import { findSameReading, findSweepByIdentity, insertSweep, updateSwitching } from './sweep-store';
import { findGridId, insertGrid, insertTrace } from './trace-store';

export interface SweepUpload {
  bytes: Uint8Array;
  fileName: string;
  tags: SweepTags;
  /** Key of the owning team; needed only when several teams of the actor have the product's key. */
  team?: string;
  batchId?: number;
  /** When the file was handed over, UTC milliseconds; now, unless it waited in a batch. */
  receivedAt?: number;
}

export interface ImportedSweep {
  /** The same file with the same tags was stored before; nothing changed. */
  duplicate: boolean;
  sweepId: number;
}

/** The clock of a bench may be this much ahead of the server's. */
const CLOCK_TOLERANCE_MS = 5 * 60_000;

/**
 * Stores one sweep: the one way in for pages, benches and batches. Revisions, states and units that do not exist yet are
 * made; product and bench must exist. All of it is stored or nothing.
 *
 * @throws ServiceError `notFound`, `forbidden` or `conflict` for product and bench; `unreadable` with the place in the file;
 *   `contradiction` between file and tags
 */
export function importSweep(context: Context, actor: Actor, upload: SweepUpload): ImportedSweep {
  const { db } = context;
  const { bytes, tags } = upload;
  const found = findProduct(context, actor, tags.product, upload.team, 'sweeps.add');
  if (found.product.archivedAt !== null) {
    throw new ServiceError('conflict', `product: "${tags.product}" is archived and takes no more sweeps`);
  }
  const bench = findBenchInUse(context, found.team.id, tags.bench);
  const originalSha256 = sha256(bytes);
  const identity = sweepIdentity(originalSha256, tags);
  const stored = findSweepByIdentity(db, found.product.id, identity);
  if (stored !== undefined) return { duplicate: true, sweepId: stored };

  const measured = measureSweep(bytes, tags, found);
  context.originals.keep(bytes, originalSha256);
  return withTransaction(db, () => {
    // Costs a look, unless the file was swept away as nobody's since the line above.
    context.originals.keep(bytes, originalSha256);
    // The other process may have stored the very same sweep since the look above.
    const meanwhile = findSweepByIdentity(db, found.product.id, identity);
    if (meanwhile !== undefined) return { duplicate: true, sweepId: meanwhile };
    return {
      duplicate: false,
      sweepId: store(context, actor, upload, { found, bench, originalSha256, identity }, measured),
    };
  });
}

interface SweepPlace {
  found: FoundProduct;
  bench: Bench;
  originalSha256: string;
  identity: string;
}

function store(
  context: Context,
  actor: Actor,
  { tags, fileName, batchId, receivedAt = context.now() }: SweepUpload,
  { found: { product, team }, bench, originalSha256, identity }: SweepPlace,
  { reading, trace, gridHash, grid, readingHash, margins, packed }: MeasuredSweep,
): number {
  const { db } = context;
  const takenAt = tags.takenAt === undefined ? receivedAt : Date.parse(tags.takenAt);
  const { hardware, firmware } = tags;
  const build = findOrCreateBuild(context, actor, product, { hardware, firmware, builtAt: takenAt });
  const state = findOrCreateState(context, actor, product, tags.state);
  const unit = tags.unit === undefined ? null : findOrCreateUnit(context, product, tags.unit);
  const merged = mergeSwitching(build.switching, tags.switching);
  if (merged.isChanged) updateSwitching(db, build.id, merged.switching);
  const rbwHz = tags.rbwHz ?? reading.settings.rbwHz ?? null;

  const sweepId = insertSweep(db, {
    teamId: team.id,
    productId: product.id,
    buildId: build.id,
    stateId: state.id,
    unitId: unit?.id ?? null,
    benchId: bench.id,
    line: tags.line,
    detector: tags.detector,
    kind: tags.kind,
    takenAt,
    run: tags.run ?? `${localDay(takenAt, team.timeZone)} ${bench.key}`,
    rbwHz,
    attenuationDb: tags.attenuationDb ?? reading.settings.attenuationDb ?? null,
    correction: tags.corrected ? 'inFile' : 'none',
    gridId: findGridId(db, gridHash) ?? insertGrid(db, gridHash, grid, bytesOf(reading.frequenciesHz)),
    originalSha256,
    fileName,
    traceNumber: tags.trace,
    frequencyUnit: reading.frequencyUnit,
    levelUnit: trace.levelUnit,
    identity,
    readingHash,
    remarks: [
      ...remarksOnTags(tags, takenAt, context.now()),
      ...remarkOnSameReading(findSameReading(db, product.id, readingHash)),
      ...merged.contradictions.map((text) => ({ code: 'switching', text })),
      ...reading.inferred.map(({ what, value, why }) => ({ code: 'inferred', text: `${what} ${value}: ${why}` })),
      ...remarksOnSettings({ rbwHz, grid }),
      ...remarksOnBands(margins.bands),
    ],
    ...margins,
    importedAt: context.now(),
    importedByKind: actor.kind,
    importedById: actorId(actor),
    importedByName: actor.name,
    batchId: batchId ?? null,
  });
  insertTrace(db, { sweepId, ...packed });
  rollUpBuild(context, build.id);
  markStale(context, product.id, build.position + 1);
  return sweepId;
}

function remarksOnTags(tags: SweepTags, takenAt: number, now: number): SweepRemark[] {
  const remarks: SweepRemark[] = [];
  if (!tags.corrected) {
    remarks.push({
      code: 'uncorrected',
      text: 'levels are uncorrected readings: LISN, cable and limiter factors are not in them',
    });
  }
  if (takenAt > now + CLOCK_TOLERANCE_MS) {
    remarks.push({ code: 'takenInFuture', text: `taken at ${tags.takenAt}, which is still to come: check the clock` });
  }
  return remarks;
}

function remarkOnSameReading(sweepId: number | undefined): SweepRemark[] {
  if (sweepId === undefined) return [];
  return [{ code: 'sameReading', text: `the same numbers as sweep ${sweepId}: one reading exported twice` }];
}
