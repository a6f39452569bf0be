import { findLimitSet } from '@shared/limits/limit-sets';
import type { Actor } from '../actor';
import type { Context } from '../context';
import { enqueueRun } from '../queue/enqueue-run';
import { latestRun } from '../queue/latest-run';
import type { JobRun } from '../queue/run-store';
import { listMeasuredLimits } from './remeasure-store';

/** Asks the jobs process to take the margins of a team's sweeps anew where they are not those of its present bands. */
export function requestRemeasure(context: Context, actor: Actor, teamId: number, trigger: JobRun['trigger']): void {
  enqueueRun(context, actor, { job: 'remeasure', teamId, lockKey: lockOf(teamId), payload: { teamId }, trigger });
}

/** Asks again where the last run failed, and where sweeps were measured against another version of a limit set. */
export function requestDueRemeasures(context: Context, trigger: 'schedule' | 'start'): void {
  const actor = { kind: 'job', name: 'remeasure' } as const;
  const limits = listMeasuredLimits(context.db);
  const outdated = new Set(limits.filter(isOutdated).map(({ teamId }) => teamId));
  for (const teamId of new Set(limits.map((limit) => limit.teamId))) {
    const isUnfinished = latestRun(context, lockOf(teamId))?.status === 'failed';
    if (isUnfinished || outdated.has(teamId)) requestRemeasure(context, actor, teamId, trigger);
  }
}

/** A set this program does not have cannot be measured against at all. */
function isOutdated({ limitSetKey, limitSetVersion }: ReturnType<typeof listMeasuredLimits>[number]): boolean {
  const set = findLimitSet(limitSetKey);
  return set !== undefined && set.version !== limitSetVersion;
}

function lockOf(teamId: number): string {
  return `remeasure:${teamId}`;
}
