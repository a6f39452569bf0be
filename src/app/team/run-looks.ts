import type { JobName, JobRunView } from '@shared/contracts/job-runs';
import type { IconName } from '../ui/icons';

export const JOB_WORDS: Record<JobName, string> = {
  judge: 'Judge builds',
  import: 'Import files',
  remeasure: 'Take margins again',
  digest: 'Write the digest',
  mail: 'Send mail',
  prune: 'Tidy old records',
};

export const STATUS_LOOKS: Record<JobRunView['status'], { word: string; icon: IconName }> = {
  waiting: { word: 'waiting', icon: 'clock' },
  running: { word: 'running', icon: 'play' },
  done: { word: 'done', icon: 'check' },
  failed: { word: 'failed', icon: 'error' },
};

/** Who or what asked for the run. */
export function askedBy({ trigger, requestedBy }: Pick<JobRunView, 'trigger' | 'requestedBy'>): string {
  switch (trigger) {
    case 'person':
      return requestedBy;
    case 'token':
      return `token ${requestedBy}`;
    case 'import':
      return 'new sweeps';
    case 'start':
      return 'start of the jobs';
    case 'schedule':
      return 'schedule';
  }
}

/** Counts of a run as words: "judged 3, lost 1". */
export function countWords(counts: JobRunView['counts']): string {
  return Object.entries(counts)
    .map(([name, count]) => `${name.replace(/[A-Z]/g, (letter) => ` ${letter.toLowerCase()}`)} ${count}`)
    .join(', ');
}

/** How long a run took, or has taken by now: "0.4 s", "12 s", "3 min 5 s"; empty before it started. */
export function durationText({ startedAt, finishedAt }: JobRunView, nowMs: number): string {
  if (startedAt === null) return '';
  const durationMs = Math.max(0, (finishedAt === null ? nowMs : Date.parse(finishedAt)) - Date.parse(startedAt));
  if (durationMs < 10_000) return `${(durationMs / 1000).toFixed(1)} s`;
  const seconds = Math.round(durationMs / 1000);
  return seconds < 60 ? `${seconds} s` : `${Math.floor(seconds / 60)} min ${seconds % 60} s`;
}
