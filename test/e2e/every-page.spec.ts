import { readFileSync } from 'node:fs';
import type { Browser } from 'playwright-core';
import { launchBrowser } from '../support/launch-browser';
import { RunningInstallation } from '../support/running-installation';
import { PEOPLE, Visit } from './pages/visit';

jest.setTimeout(240_000);

const AXE = readFileSync(require.resolve('axe-core/axe.min.js'), 'utf8');
const SCREENS = [
  { name: 'wide and light', width: 1440, height: 900, colorScheme: 'light' },
  { name: 'a phone and dark', width: 390, height: 844, colorScheme: 'dark' },
] as const;
const PAGES: Record<Exclude<keyof typeof PEOPLE, 'stranger' | 'technician'> | 'nobody', string[]> = {
  nobody: ['/sign-in', '/forgot-password', '/mailbox', '/unsubscribe/none', '/reset/none', '/invitation/none'],
  lead: [
    '/t/charging/overview',
    '/t/charging/products/charger-750/map',
    '/t/charging/products/charger-750/trend',
    '/t/charging/products/charger-750/overlay',
    '/t/charging/products/charger-750/builds',
    '/t/charging/products/charger-750/settings',
    '/t/charging/products/charger-750/builds/14',
    '/t/charging/drops',
    '/t/charging/drops/1',
    '/t/charging/sweeps',
    '/t/charging/sweeps/20',
    '/t/charging/import',
    '/t/charging/benches',
    '/t/charging/limits',
    '/t/charging/members',
    '/t/charging/tokens',
    '/t/charging/digest',
    '/t/charging/audit',
    '/t/charging/jobs',
    '/account',
    '/nowhere',
  ],
  engineer: ['/t/charging/drops/1'],
  viewer: ['/t/charging/overview', '/t/charging/import', '/t/charging/digest', '/t/charging/audit'],
  administrator: ['/installation/teams', '/installation/people'],
};

let installation: RunningInstallation;
let browser: Browser;

beforeAll(async () => {
  [installation, browser] = await Promise.all([RunningInstallation.start(), launchBrowser()]);
});
afterAll(async () => {
  await browser.close();
  await installation.stop();
});

/** What axe finds serious or worse, as "page: rule, where". */
async function seriousFaults(visit: Visit, path: string): Promise<string[]> {
  await visit.page.evaluate(AXE);
  const found = await visit.page.evaluate(async () => {
    const { violations } = await (window as unknown as { axe: { run(): Promise<AxeResult> } }).axe.run();
    return violations.filter(({ impact }) => impact === 'serious' || impact === 'critical');
  });
  return found.map(({ id, nodes }) => `${path}: ${id}, ${nodes.map(({ target }) => target.join(' ')).join('; ')}`);
}

interface AxeResult {
  violations: { id: string; impact: string; nodes: { target: string[] }[] }[];
}

describe.each(SCREENS)('every page, $name', ({ width, height, colorScheme }) => {
  it.each(Object.entries(PAGES))(
    'as %s shows a heading, fits the screen, keeps the content policy and has no serious fault for axe',
    async (who, paths) => {
      const visit = await Visit.begin(browser, installation, width, height);
      await visit.page.emulateMedia({ colorScheme });
      if (who !== 'nobody') await visit.signIn(who as keyof typeof PEOPLE);
      const faults: string[] = [];
      for (const path of paths) {
        await visit.open(path);
        const heading = visit.page.locator('h1').first();
        const isThere = await heading.waitFor({ timeout: 10_000 }).then(
          () => true,
          () => false,
        );
        if (!isThere) {
          faults.push(`${path}: no heading`);
          continue;
        }
        await visit.page.locator('[aria-busy="true"]').first().waitFor({ state: 'detached' });
        const overflow = await visit.page.evaluate(() => document.documentElement.scrollWidth - innerWidth);
        if (overflow > 0) faults.push(`${path}: ${overflow} px wider than the screen`);
        faults.push(...(await seriousFaults(visit, path)));
      }
      await visit.end();
      expect([...faults, ...visit.faults]).toEqual([]);
    },
  );
});
