import { type ChildProcess, spawn } from 'node:child_process';
import { mkdtempSync, rmSync } from 'node:fs';
import { createServer, type AddressInfo } from 'node:net';
import { tmpdir } from 'node:os';
import { join } from 'node:path';

/** Seeding the demo takes some tens of seconds, twice that on a busy machine. */
const START_TIMEOUT_MS = 150_000;

/** A whole installation as `npm start` runs it: web server and jobs process on a data folder of its own. */
export class RunningInstallation {
  private constructor(
    readonly url: string,
    readonly dataDir: string,
    private readonly ports: { web: number; mailbox: number },
    private child: ChildProcess,
  ) {}

  /** Starts one with the demo on an empty folder, and resolves when both processes are up. */
  static async start(): Promise<RunningInstallation> {
    const dataDir = mkdtempSync(join(tmpdir(), 'strandline-e2e-'));
    const ports = { web: await freePort(), mailbox: await freePort() };
    const installation = new RunningInstallation(`http://127.0.0.1:${ports.web}`, dataDir, ports, run(dataDir, ports));
    await installation.untilUp();
    return installation;
  }

  /** Kills both processes at once, as a power cut would, and starts them again on the same data. */
  async restartHard(): Promise<void> {
    await this.kill('SIGKILL');
    this.child = run(this.dataDir, this.ports);
    await this.untilUp();
  }

  async stop(): Promise<void> {
    await this.kill('SIGTERM');
    rmSync(this.dataDir, { recursive: true, force: true });
  }

  private async kill(signal: NodeJS.Signals): Promise<void> {
    const { child } = this;
    if (child.pid === undefined || child.exitCode !== null || child.signalCode !== null) return;
    const gone = new Promise((resolve) => child.once('close', resolve));
    // The minus: the whole process group, since the start script runs the two as its children.
    process.kill(-child.pid, signal);
    await gone;
  }

  private async untilUp(): Promise<void> {
    const deadline = Date.now() + START_TIMEOUT_MS;
    while (Date.now() < deadline) {
      if (this.child.exitCode !== null) throw new Error(`the installation ended with code ${this.child.exitCode}`);
      const health = await fetch(`${this.url}/api/health`).then(
        (response) => response.json() as Promise<{ jobs: string }>,
        () => undefined,
      );
      if (health?.jobs === 'up') return;
      await new Promise((resolve) => setTimeout(resolve, 250));
    }
    throw new Error('the installation did not come up');
  }
}

function run(dataDir: string, ports: { web: number; mailbox: number }): ChildProcess {
  return spawn(process.execPath, ['--import', 'tsx', 'server/start.ts'], {
    detached: true,
    stdio: ['ignore', 'ignore', 'inherit'],
    env: {
      ...process.env,
      NODE_ENV: 'development',
      STRANDLINE_DATA_DIR: dataDir,
      STRANDLINE_DEMO: 'auto',
      PORT: String(ports.web),
      MAILBOX_PORT: String(ports.mailbox),
      LOG_LEVEL: 'error',
    },
  });
}

function freePort(): Promise<number> {
  return new Promise((resolve, reject) => {
    const server = createServer().once('error', reject);
    server.listen(0, '127.0.0.1', () => {
      const { port } = server.address() as AddressInfo;
      server.close(() => resolve(port));
    });
  });
}
