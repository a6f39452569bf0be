import { digestJob } from './digest';
import { importJob } from './import';
import type { Job } from './job';
import { judgeJob } from './judge';
import { mailJob } from './mail';
import { pruneJob } from './prune';

/** Every job there is. */
export const JOBS: readonly Job[] = [judgeJob, importJob, digestJob, mailJob, pruneJob];
