import type { BenchPatch } from '@shared/contracts/benches';
import type { Actor } from '../actor';
import { recordAudit } from '../audit/record-audit';
import type { Context } from '../context';
import { withTransaction } from '../db/with-transaction';
import { type Bench, type BenchChange, updateBench } from './bench-store';

/** Changes what is said of a bench, or archives it and takes it back into use. */
export function changeBench(context: Context, actor: Actor, bench: Bench, patch: BenchPatch): Bench {
  const changed = changesOf(bench, patch, context.now());
  if (changed.length === 0) return bench;
  return withTransaction(context.db, () => {
    const after = updateBench(context.db, bench.id, Object.fromEntries(changed.map(({ name, to }) => [name, to])));
    recordAudit(context, actor, {
      teamId: bench.teamId,
      action: 'bench.changed',
      subjectKind: 'bench',
      subjectId: bench.id,
      summary: `Bench ${bench.key} was changed: ${changed.map(({ name }) => name).join(', ')}`,
      details: Object.fromEntries(changed.map(({ name, from, to }) => [name, { from, to }])),
    });
    return after;
  });
}

/** What really becomes different. */
function changesOf(bench: Bench, { isArchived = bench.archivedAt !== null, ...texts }: BenchPatch, now: number) {
  const archivedAt = isArchived ? (bench.archivedAt ?? now) : null;
  const { name, location, lisn, receiver, notes } = { ...bench, ...texts };
  const after: Required<BenchChange> = { name, location, lisn, receiver, notes, archivedAt };
  return Object.entries(after)
    .map(([column, to]) => ({ name: column, from: bench[column as keyof BenchChange], to }))
    .filter(({ from, to }) => from !== to);
}
