import { type ChildProcess, spawn } from 'node:child_process';

/** Starts the web server and, once it has migrated and listens, the jobs process; when either ends, so does the other. */
const children: ChildProcess[] = [];
let isStopping = false;

function run(file: string): ChildProcess {
  const child = spawn(process.execPath, ['--import', 'tsx', file], { stdio: ['ignore', 'inherit', 'inherit', 'ipc'] });
  children.push(child);
  child.once('exit', (code) => {
    if (!isStopping) {
      process.exitCode = code ?? 1;
      stop();
    }
  });
  return child;
}

function stop(): void {
  isStopping = true;
  for (const child of children) if (child.exitCode === null) child.kill('SIGTERM');
}

process.once('SIGTERM', stop);
process.once('SIGINT', stop);
run('server/main.ts').once('message', () => run('jobs/main.ts'));
