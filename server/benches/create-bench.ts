import type { BenchInput } from '@shared/contracts/benches';
import type { Actor } from '../actor';
import { recordAudit } from '../audit/record-audit';
import type { Context } from '../context';
import { withTransaction } from '../db/with-transaction';
import { ServiceError } from '../service-error';
import { type Bench, findBenchByKey, insertBench } from './bench-store';

/** @throws ServiceError `conflict` when the team has a bench with the key, archived or not */
export function createBench(context: Context, actor: Actor, teamId: number, input: BenchInput): Bench {
  return withTransaction(context.db, () => {
    if (findBenchByKey(context.db, teamId, input.key) !== undefined) {
      throw new ServiceError('conflict', `key: the team has a bench "${input.key}" already`);
    }
    const bench = insertBench(context.db, { ...input, teamId, createdAt: context.now() });
    recordAudit(context, actor, {
      teamId,
      action: 'bench.created',
      subjectKind: 'bench',
      subjectId: bench.id,
      summary: `Bench ${bench.key} (${bench.name}) was added`,
      details: { ...input },
    });
    return bench;
  });
}
