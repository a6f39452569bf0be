import type { ImportBatchView } from '@shared/contracts/imports';
import { isoTime, isoTimeOrNull } from '../iso-time';
import { presentRun } from '../queue/present-run';
import type { BatchProgress } from './find-batch';
import type { ItemResult } from './import-store';

export function presentBatch({ batch, createdBy, counts, run, items }: BatchProgress): ImportBatchView {
  const [imported, duplicate, refused, waiting] = (['imported', 'duplicate', 'refused', 'waiting'] as const).map(
    (status) => counts.get(status) ?? 0,
  );
  return {
    id: batch.id,
    createdAt: isoTime(batch.createdAt),
    createdBy,
    finishedAt: isoTimeOrNull(batch.finishedAt),
    total: [...counts.values()].reduce((sum, some) => sum + some, 0),
    imported,
    duplicate,
    refused,
    waiting,
    run: run === undefined ? null : presentRun(run),
    items: items.map(presentItem),
  };
}

function presentItem({ item, ...result }: ItemResult): ImportBatchView['items'][number] {
  const { id, fileName, tags, status, sweepId, problem } = item;
  return { id, fileName, tags, status, sweepId, ...result, problem };
}
