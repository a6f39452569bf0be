import { digestJob } from './digest';
import { importJob } from './import';
import type { Job } from './job';
import { judgeJob } from './judge';
import { mailJob } from './mail';
import { pruneJob } from './prune';
import { remeasureJob } from './remeasure';

/** Every job there is. */
export const JOBS: readonly Job[] = [judgeJob, importJob, remeasureJob, digestJob, mailJob, pruneJob];
