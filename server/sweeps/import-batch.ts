import { setImmediate } from 'node:timers/promises';
import { SweepTags } from '@shared/contracts/sweeps';
import * as z from 'zod';
import { personActor } from '../accounts/person-actor';
import type { Context } from '../context';
import { isStorageFault } from '../db/is-storage-fault';
import { withTransaction } from '../db/with-transaction';
import { problemOf } from '../http/problem-of';
import { requestJudging } from '../judging/request-judging';
import type { HeldRun } from '../queue/held-run';
import { ServiceError } from '../service-error';
import { teamById } from '../teams/find-team';
import { importSweep } from './import-sweep';
import {
  findBatchById,
  finishBatch,
  type ImportBatch,
  type ImportItem,
  listImportedProducts,
  listWaitingItems,
  settleItem,
} from './import-store';

const Payload = z.object({ batchId: z.int() });

/**
 * Works through what still waits of a batch. Every item is a transaction of its own that stores the sweep and settles the
 * item together: stopped anywhere and begun again, by whatever worker, nothing is lost and nothing is imported twice.
 */
export async function importBatch(context: Context, held: HeldRun): Promise<void> {
  const { batchId } = Payload.parse(held.run.payload);
  const batch = findBatchById(context.db, batchId);
  if (batch === undefined) throw new Error(`import batch ${batchId} is gone`);
  const items = listWaitingItems(context.db, batchId);
  held.expect(items.length);
  for (const item of items) {
    held.advance(importItem(context, batch, item));
    // Lets the process say between two files that it is alive.
    await setImmediate();
  }
  finishBatch(context.db, batchId, context.now());
  // The set is complete now; sweeps that a bench sends one by one wait for the job's clock instead.
  for (const product of listImportedProducts(context.db, batchId)) {
    requestJudging(context, { kind: 'job', name: 'import' }, product, 'import');
  }
}

type Outcome = 'imported' | 'duplicate' | 'refused' | 'taken';

function importItem(context: Context, batch: ImportBatch, item: ImportItem): Outcome {
  try {
    return withTransaction(context.db, () => {
      const { duplicate, sweepId } = importSweep(context, importerOf(context, batch), {
        bytes: context.originals.read(item.originalSha256),
        fileName: item.fileName,
        tags: SweepTags.parse({ ...batch.tags, ...item.tags }),
        team: teamById(context, batch.teamId).key,
        batchId: batch.id,
        receivedAt: batch.createdAt,
      });
      const outcome = duplicate ? 'duplicate' : 'imported';
      return settleItem(context.db, item.id, { status: outcome, sweepId }) ? outcome : 'taken';
    });
  } catch (error) {
    // The run fails and the item waits for the next one.
    if (isStorageFault(error)) throw error;
    const isExpected = error instanceof ServiceError || error instanceof z.ZodError;
    if (!isExpected) context.log.error({ err: error, item: item.id }, 'could not import a file of a batch');
    return settleItem(context.db, item.id, { status: 'refused', problem: problemOf(error) }) ? 'refused' : 'taken';
  }
}

/** Who handed the batch over, with the roles of today. */
function importerOf(context: Context, batch: ImportBatch) {
  const person = personActor(context, batch.createdBy);
  if (person === undefined) {
    throw new ServiceError('forbidden', 'the person who handed these files over has no account any more');
  }
  return person;
}
