import { judgeStaleBuilds } from '../server/judging/judge-stale-builds';
import { requestStaleProducts } from '../server/judging/request-judging';
import type { Job } from './job';

/** Judges what is not judged yet: every three minutes, and once more at night for what a restart left. */
export const judgeJob: Job = {
  name: 'judge',
  schedule: ['*/3 * * * *', '20 2 * * *'],
  request: requestStaleProducts,
  run: judgeStaleBuilds,
};
