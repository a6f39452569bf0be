import { execFileSync } from 'node:child_process';
import { existsSync, mkdirSync, readFileSync, renameSync, rmSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { fileURLToPath } from 'node:url';

const projectFolder = fileURLToPath(new URL('../..', import.meta.url));
const installedBrowsers = ['/usr/bin/chromium', '/usr/bin/chromium-browser', '/usr/bin/google-chrome'];
const adviceWhenNone =
  'No browser for the page tests: install Chromium (Debian: apt-get install chromium) or set CHROMIUM_PATH to a Chromium executable.';

/**
 * Jest's global set-up of the browser tests. Leaves the browser to launch in the environment, as JSON
 * { executablePath, environment }, where launch-browser.ts picks it up.
 */
export default async function findBrowserForJest() {
  process.env.STRANDLINE_TEST_BROWSER = JSON.stringify(findBrowser());
}

/** The first that is there: the one the environment names, an installed Chromium, the one inside the npm package. */
export function findBrowser() {
  const named = process.env.CHROMIUM_PATH;
  if (named) {
    if (!existsSync(named)) throw plainError(`CHROMIUM_PATH names no file: ${named}`);
    return { executablePath: named, environment: {} };
  }
  const installed = installedBrowsers.find((path) => existsSync(path));
  if (installed) return { executablePath: installed, environment: {} };
  return findPackagedBrowser() ?? fail();
}

/** The headless Chromium that @sparticuz/chromium ships packed, for Linux on x64 alone; unpacked once per version. */
function findPackagedBrowser() {
  const packageFolder = join(projectFolder, 'node_modules/@sparticuz/chromium');
  if (process.platform !== 'linux' || process.arch !== 'x64' || !existsSync(packageFolder)) return undefined;
  const { version } = JSON.parse(readFileSync(join(packageFolder, 'package.json'), 'utf8'));
  const folder = join(projectFolder, '.cache', `chromium-${version}`);
  if (!existsSync(folder)) unpackInto(folder);

  const executablePath = join(folder, 'chromium');
  const environment = { FONTCONFIG_PATH: join(folder, 'fonts') };
  if (!lacksLibraries(executablePath, environment)) return { executablePath, environment };
  environment.LD_LIBRARY_PATH = join(folder, 'al2023/lib');
  return lacksLibraries(executablePath, environment) ? undefined : { executablePath, environment };
}

/**
 * The package unpacks to the temporary folder and keeps whatever it finds there, so it gets a folder of its own that takes its
 * final name only when complete. It adds its own copies of the NSS libraries when it believes itself on that cloud runtime.
 */
function unpackInto(folder) {
  const partial = `${folder}.partial`;
  rmSync(partial, { recursive: true, force: true });
  mkdirSync(partial, { recursive: true });
  const unpack =
    "import c from '@sparticuz/chromium'; await c.executablePath().catch((e) => { console.error(e); process.exit(1); });";
  execFileSync(process.execPath, ['--input-type=module', '-e', unpack], {
    cwd: projectFolder,
    env: { ...process.env, TMPDIR: partial, AWS_EXECUTION_ENV: 'AWS_Lambda_nodejs20.x' },
  });
  const fontsFile = join(partial, 'fonts/fonts.conf');
  writeFileSync(fontsFile, readFileSync(fontsFile, 'utf8').replaceAll('/tmp/', `${folder}/`));
  renameSync(partial, folder);
}

function lacksLibraries(executablePath, environment) {
  try {
    return execFileSync('ldd', [executablePath], { env: { ...process.env, ...environment } }).includes('not found');
  } catch {
    return true;
  }
}

function fail() {
  throw plainError(adviceWhenNone);
}

/** An error that Jest prints as its one line, without a stack. */
function plainError(message) {
  return Object.assign(new Error(message), { stack: message });
}
