import { spawnSync } from 'node:child_process';
import { existsSync, readdirSync, statSync } from 'node:fs';
import { createRequire } from 'node:module';
import { join } from 'node:path';

/** What the built pages are made of. The lock file stands for the packages. */
const sources = ['src', 'shared', 'angular.json', 'tsconfig.json', 'package-lock.json'];
const built = 'dist/client/index.html';

/** Run before the server and the browser tests: builds the pages when there are none, or when a source is newer. */
if (!existsSync(built) || newestChangeMs(sources) > statSync(built).mtimeMs) {
  console.log('The pages are missing or older than their sources: building them.');
  const ng = createRequire(join(process.cwd(), 'package.json')).resolve('@angular/cli/bin/ng.js');
  process.exitCode = spawnSync(process.execPath, [ng, 'build'], { stdio: 'inherit' }).status ?? 1;
}

/** Time of the latest change, in ms, of the files at and below the paths; specs are no part of the pages. */
function newestChangeMs(paths: string[]): number {
  return paths.reduce((newest, path) => {
    if (path.endsWith('.spec.ts')) return newest;
    const status = statSync(path);
    const changedMs = status.isDirectory()
      ? newestChangeMs(readdirSync(path).map((name) => join(path, name)))
      : status.mtimeMs;
    return Math.max(newest, changedMs);
  }, 0);
}
