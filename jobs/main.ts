import { randomUUID } from 'node:crypto';
import { readConfig } from '../server/config/read-config';
import { createContext } from '../server/context';
import { requireCurrentSchema } from '../server/db/migrate';
import { JOBS } from './registry';
import { startScheduler } from './scheduler';
import { startWorker } from './worker';

const context = createContext(readConfig(process.env), 'jobs');
requireCurrentSchema(context.db);
const stopping = new AbortController();
const stopScheduler = startScheduler(context, JOBS);
for (const signal of ['SIGTERM', 'SIGINT'] as const) process.once(signal, () => stopping.abort());
await startWorker(context, `${process.pid}-${randomUUID().slice(0, 8)}`, JOBS, stopping.signal);
stopScheduler();
context.close();
