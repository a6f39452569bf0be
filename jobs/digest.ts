import { requestDueDigests } from '../server/digests/request-digests';
import { writeDigest } from '../server/digests/write-digest';
import type { Job } from './job';

/** Writes the weekly digest of every team whose hour has come; once a week however often it is asked for. */
export const digestJob: Job = {
  name: 'digest',
  schedule: ['*/10 * * * *'],
  request: requestDueDigests,
  run: writeDigest,
};
