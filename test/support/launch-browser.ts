import { chromium, type Browser } from 'playwright-core';

const launchArguments = [
  '--no-sandbox',
  '--disable-gpu',
  '--disable-dev-shm-usage',
  '--disable-quic',
  '--disable-background-networking',
  '--disable-component-update',
  '--disable-sync',
  '--no-first-run',
];

/** Starts the browser that find-browser.mjs chose. Start one a run: the first page of a fresh browser is the slow one. */
export async function launchBrowser(): Promise<Browser> {
  const found = process.env['STRANDLINE_TEST_BROWSER'];
  if (found === undefined) throw new Error('No browser was looked for: run this spec in the e2e project of Jest.');
  const { executablePath, environment } = JSON.parse(found) as {
    executablePath: string;
    environment: Record<string, string>;
  };
  return chromium.launch({ executablePath, args: launchArguments, env: { ...process.env, ...environment } });
}
