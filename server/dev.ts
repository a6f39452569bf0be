import { type ChildProcess, spawn } from 'node:child_process';
import { createRequire } from 'node:module';
import { join } from 'node:path';
import { readConfig } from './config/read-config';

/**
 * For development: the web server and the jobs process start again at every change of their sources, the pages are rebuilt and
 * reloaded by Angular's own server. The jobs wait until the web server has migrated and answers.
 */
const require = createRequire(join(process.cwd(), 'package.json'));
const tsx = require.resolve('tsx/cli');
const ng = require.resolve('@angular/cli/bin/ng.js');
const health = `http://127.0.0.1:${readConfig(process.env).port}/api/health`;
const children: ChildProcess[] = [];
let isStopping = false;

function run(script: string, ...words: string[]): void {
  if (isStopping) return;
  const child = spawn(process.execPath, [script, ...words], { stdio: ['ignore', 'inherit', 'inherit'] });
  child.once('exit', stop);
  children.push(child);
}

function stop(): void {
  isStopping = true;
  for (const child of children) if (child.exitCode === null) child.kill('SIGTERM');
}

async function answers(): Promise<boolean> {
  return fetch(health).then(
    (response) => response.ok,
    () => false,
  );
}

process.once('SIGTERM', stop);
process.once('SIGINT', stop);
run(tsx, 'watch', '--clear-screen=false', 'server/main.ts');
run(ng, 'serve');
while (!isStopping && !(await answers())) await new Promise((resolve) => setTimeout(resolve, 500));
run(tsx, 'watch', '--clear-screen=false', 'jobs/main.ts');
