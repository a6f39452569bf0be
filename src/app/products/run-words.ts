import type { JobRunView } from '@shared/contracts/job-runs';

/** How a run of the judgement stands, with counts. */
export function runWords(run: JobRunView | null): string {
  if (!run) return '';
  const { status, done, total, errors } = run;
  const builds = (count: number) => `${count} ${count === 1 ? 'build' : 'builds'}`;
  switch (status) {
    case 'waiting':
      return 'Waiting for its turn. You may leave this page; it goes on.';
    case 'running':
      return total > 0 ? `Judging: ${done} of ${builds(total)}.` : 'Judging.';
    case 'failed':
      return `The run failed: ${errors[0]?.message ?? 'see Job runs for why'}.`;
    case 'done':
      if (errors.length > 0) return `${builds(errors.length)} could not be judged: ${errors[0].message}`;
      return total === 0 ? 'Everything was judged already.' : `${builds(total)} judged.`;
  }
}
