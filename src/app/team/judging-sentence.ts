import type { JobRunView } from '@shared/contracts/job-runs';
import { isUnderWay } from '../ui/follow-run';

/** How far the runs a lead just asked for have come; empty when none was asked for. */
export function judgingSentence(runs: readonly Pick<JobRunView, 'status' | 'total' | 'done' | 'errors'>[]): string {
  if (runs.length === 0) return '';
  const total = runs.reduce((sum, run) => sum + run.total, 0);
  const done = runs.reduce((sum, run) => sum + run.done, 0);
  const builds = (count: number) => `${count} ${count === 1 ? 'build' : 'builds'}`;
  const waiting = runs.filter(isUnderWay).length;
  if (waiting > 0) {
    const progress = total === 0 ? '' : `, ${done} of ${builds(total)} judged`;
    return `Judging: ${runs.length - waiting} of ${runs.length} products done${progress}. You may leave the page.`;
  }
  const failed = runs.filter(({ status, errors }) => status === 'failed' || errors.length > 0).length;
  if (failed > 0) return `Judged, with errors in ${failed} of ${runs.length} runs: see below.`;
  return total === 0 ? 'Everything was judged already.' : `${builds(total)} judged.`;
}
