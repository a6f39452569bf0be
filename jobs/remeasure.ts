import { remeasureSweeps } from '../server/sweeps/remeasure-sweeps';
import { requestDueRemeasures } from '../server/sweeps/request-remeasure';
import type { Job } from './job';

/** Takes margins anew after a team changed its bands; asked for by the change, and for what failed at the start and at night. */
export const remeasureJob: Job = {
  name: 'remeasure',
  schedule: ['10 1 * * *'],
  request: requestDueRemeasures,
  run: remeasureSweeps,
};
