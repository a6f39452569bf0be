import { importBatch } from '../server/sweeps/import-batch';
import { requestOpenBatches } from '../server/sweeps/request-batches';
import type { Job } from './job';

/** Works through batches of files handed over by page; asked for by the upload, and again at the start for what was left. */
export const importJob: Job = {
  name: 'import',
  schedule: ['*/5 * * * *'],
  request: requestOpenBatches,
  run: importBatch,
};
