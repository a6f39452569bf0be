import { type ChildProcess, fork } from 'node:child_process';
import { once } from 'node:events';
import { fileURLToPath } from 'node:url';
import type { ServerReport } from './ingest-server';
import { syntheticTags } from './synthetic-sweep';

export interface HttpIngest {
  sweepsPerSecond: number;
  serverCpuMs: number;
  databaseBytesPerSweep: number;
  /** Wall time of one request, ms, sorted. */
  durationsMs: number[];
}

const IN_FLIGHT = 4;
/** Sweeps sent before the clock starts, so that the code is compiled. */
const WARM_UP = 60;

/** Sends every file through the real interface to a server in a process of its own; a few requests in flight at a time. */
export async function ingestOverHttp(files: readonly Buffer[], warmUp: readonly Buffer[]): Promise<HttpIngest> {
  const child = fork(fileURLToPath(new URL('./ingest-server.ts', import.meta.url)), { execArgv: ['--import', 'tsx'] });
  const ready = await heard(child, 'ready');
  const send = async (file: Buffer, number: number): Promise<number> => {
    const form = new FormData();
    form.set('tags', JSON.stringify(syntheticTags(number)));
    form.set('file', new Blob([Uint8Array.from(file)]), `sweep-${number}.csv`);
    const headers = { authorization: `Bearer ${ready.token}` };
    const startedAt = performance.now();
    const answer = await fetch(`http://127.0.0.1:${ready.port}/api/v1/sweeps`, { method: 'POST', headers, body: form });
    const text = await answer.text();
    if (answer.status !== 201) throw new Error(`sweep ${number} was answered ${answer.status}: ${text}`);
    return performance.now() - startedAt;
  };
  await inFlight(warmUp.slice(0, WARM_UP), (file, number) => send(file, files.length + number));
  const before = await used(child);
  const startedAt = performance.now();
  const durationsMs = await inFlight(files, send);
  const wallMs = performance.now() - startedAt;
  const after = await used(child);
  child.send('end');
  await once(child, 'exit');
  return {
    sweepsPerSecond: (files.length / wallMs) * 1000,
    serverCpuMs: (after.cpuMs - before.cpuMs) / files.length,
    databaseBytesPerSweep: (after.databaseBytes - before.databaseBytes) / files.length,
    durationsMs: durationsMs.sort((a, b) => a - b),
  };
}

async function inFlight(files: readonly Buffer[], send: (file: Buffer, number: number) => Promise<number>) {
  const durationsMs: number[] = [];
  let next = 0;
  const worker = async (): Promise<void> => {
    for (let number = next++; number < files.length; number = next++) {
      const file = files[number];
      if (file !== undefined) durationsMs.push(await send(file, number));
    }
  };
  await Promise.all(Array.from({ length: IN_FLIGHT }, worker));
  return durationsMs;
}

async function used(child: ChildProcess) {
  child.send('used');
  return heard(child, 'used');
}

async function heard<Kind extends ServerReport['kind']>(
  child: ChildProcess,
  kind: Kind,
): Promise<Extract<ServerReport, { kind: Kind }>> {
  for (;;) {
    const [message] = (await once(child, 'message')) as [ServerReport];
    if (message.kind === kind) return message as Extract<ServerReport, { kind: Kind }>;
  }
}
