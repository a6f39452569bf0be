import { spawn } from 'node:child_process';
import { mkdtempSync, rmSync } from 'node:fs';
import { createServer } from 'node:net';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { setTimeout as wait } from 'node:timers/promises';

/**
 * Starts the project in the current folder as a newcomer would, with `npm start` on an empty data folder, until the web server
 * and the jobs process are both up; then stops it and looks that nothing is left. Ends with an exit code.
 */
const limitMs = 300_000;
const stopLimitMs = 20_000;
const dataFolder = mkdtempSync(join(tmpdir(), 'strandline-'));
const [port, mailboxPort] = [await freePort(), await freePort()];
const address = `http://127.0.0.1:${port}`;
const startedAt = Date.now();

const child = spawn('npm', ['start'], {
  detached: true,
  stdio: ['ignore', 'inherit', 'inherit'],
  env: { ...process.env, HOST: '127.0.0.1', PORT: port, MAILBOX_PORT: mailboxPort, STRANDLINE_DATA_DIR: dataFolder },
});
try {
  await untilUp();
  console.log(`The server and the jobs are up after ${Math.round((Date.now() - startedAt) / 1000)} s.`);
  const page = await fetch(address);
  if (!page.ok || !(await page.text()).includes('<app-root'))
    throw new Error(`${address} shows no page: ${page.status}`);
} catch (error) {
  console.error(`The fresh start failed: ${error.message}`);
  process.exitCode = 1;
} finally {
  await stop();
  rmSync(dataFolder, { recursive: true, force: true });
}

async function untilUp() {
  for (;;) {
    if (child.exitCode !== null) throw new Error(`npm start ended with code ${child.exitCode}`);
    const health = await fetch(`${address}/api/health`).then(
      (response) => response.ok && response.json(),
      () => undefined,
    );
    if (health?.server === 'up' && health.jobs === 'up') return;
    if (Date.now() - startedAt > limitMs)
      throw new Error(`after ${limitMs / 1000} s health is ${JSON.stringify(health)}`);
    await wait(250);
  }
}

/** Asks the whole process group to stop; one that stays is ended hard and counts as a failure. */
async function stop() {
  signalGroup('SIGTERM');
  for (const askedAt = Date.now(); Date.now() - askedAt < stopLimitMs; await wait(100)) if (!signalGroup(0)) return;
  signalGroup('SIGKILL');
  console.error(`Some process was still there ${stopLimitMs / 1000} s after it was asked to stop.`);
  process.exitCode = 1;
}

function signalGroup(signal) {
  try {
    return process.kill(-child.pid, signal);
  } catch {
    return false;
  }
}

function freePort() {
  return new Promise((resolve, reject) => {
    const server = createServer().once('error', reject);
    server.listen(0, '127.0.0.1', () => {
      const { port } = server.address();
      server.close(() => resolve(String(port)));
    });
  });
}
