import type { Context } from '../context';
import { ServiceError } from '../service-error';
import { type Bench, findBenchByKey, listBenchesOf } from './bench-store';

export type { Bench };

/** @throws ServiceError `notFound`, naming the benches the team has */
export function findBench(context: Context, teamId: number, key: string): Bench {
  const bench = findBenchByKey(context.db, teamId, key);
  if (bench !== undefined) return bench;
  const known = listBenchesOf(context.db, teamId)
    .filter(({ archivedAt }) => archivedAt === null)
    .map((one) => one.key);
  const those = known.length === 0 ? 'it has none yet' : `it has ${known.join(', ')}`;
  throw new ServiceError('notFound', `bench: the team has no bench "${key}"; ${those}`);
}

/** A bench that still takes sweeps. @throws ServiceError `notFound`, or `conflict` for an archived bench */
export function findBenchInUse(context: Context, teamId: number, key: string): Bench {
  const bench = findBench(context, teamId, key);
  if (bench.archivedAt !== null) {
    throw new ServiceError('conflict', `bench: "${key}" is archived and takes no more sweeps`);
  }
  return bench;
}
