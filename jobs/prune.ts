import { pruneRecords } from '../server/queue/prune-records';
import { enqueueRun } from '../server/queue/enqueue-run';
import type { Job } from './job';

/** Removes, every night, what nobody will ask for again: ended sessions and old records of runs. */
export const pruneJob: Job = {
  name: 'prune',
  schedule: ['50 3 * * *'],
  request: (context, trigger) => {
    const actor = { kind: 'job', name: 'prune' } as const;
    if (trigger === 'schedule') enqueueRun(context, actor, { job: 'prune', teamId: null, lockKey: 'prune', trigger });
  },
  run: pruneRecords,
};
