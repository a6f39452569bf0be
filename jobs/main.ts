import { randomUUID } from 'node:crypto';
import { readConfig } from '../server/config/read-config';
import { createContext } from '../server/context';
import { requireCurrentSchema } from '../server/db/migrate';
import { orExplain } from '../server/or-explain';
import { JOBS } from './registry';
import { startScheduler } from './scheduler';
import { startWorker } from './worker';

await orExplain(async () => {
  const context = createContext(readConfig(process.env), 'jobs');
  requireCurrentSchema(context.db);
  const stopping = new AbortController();
  for (const signal of ['SIGTERM', 'SIGINT'] as const) process.once(signal, () => stopping.abort());
  // The start script has gone without saying so.
  process.once('disconnect', () => stopping.abort());
  const stopScheduler = startScheduler(context, JOBS);
  await startWorker(context, `${process.pid}-${randomUUID().slice(0, 8)}`, JOBS, stopping.signal);
  stopScheduler();
  context.close();
  if (process.connected) process.disconnect();
});
