import type { AddressInfo } from 'node:net';
import { createApp } from '../../server/app';
import { openBenchContext } from './bench-context';

/** What the measuring process hears from the server under test. */
export type ServerReport =
  | { kind: 'ready'; port: number; token: string; folder: string }
  | { kind: 'used'; cpuMs: number; databaseBytes: number };

const context = openBenchContext();
const server = createApp(context).listen(0, '127.0.0.1', () => {
  const { port } = server.address() as AddressInfo;
  report({ kind: 'ready', port, token: context.token, folder: context.folder });
});

process.on('message', (message) => {
  if (message === 'used') {
    const { user, system } = process.cpuUsage();
    const pages = context.db.$client.pragma('page_count', { simple: true }) as number;
    const pageBytes = context.db.$client.pragma('page_size', { simple: true }) as number;
    report({ kind: 'used', cpuMs: (user + system) / 1000, databaseBytes: pages * pageBytes });
    return;
  }
  server.close();
  server.closeAllConnections();
  context.close();
  process.disconnect();
});

function report(message: ServerReport): void {
  process.send?.(message);
}
