import { mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import type { Browser, Locator } from 'playwright-core';
import { simulateDemoFiles } from '../../server/demo/simulate-demo-files';
import { LEASE_MS } from '../../server/queue/claim-run';
import { launchBrowser } from '../support/launch-browser';
import { RunningInstallation } from '../support/running-installation';
import { ImportPage } from './pages/import-page';
import { Visit } from './pages/visit';

jest.setTimeout(240_000);

let installation: RunningInstallation;
let browser: Browser;
let folder: string;
let visit: Visit;
const files = new Map<string, string>();

beforeAll(async () => {
  folder = mkdtempSync(join(tmpdir(), 'strandline-files-'));
  for (const { fileName, bytes } of simulateDemoFiles(Date.now())) {
    const path = join(folder, fileName);
    writeFileSync(path, bytes);
    files.set(fileName, path);
  }
  [installation, browser] = await Promise.all([RunningInstallation.start(), launchBrowser()]);
});
afterAll(async () => {
  await browser.close();
  await installation.stop();
  rmSync(folder, { recursive: true, force: true });
});

beforeEach(async () => {
  visit = await Visit.begin(browser, installation);
});
afterEach(async () => {
  await visit.end();
  expect(visit.faults).toEqual([]);
});

/** Paths of the generated files whose names match. */
const generated = (pattern: RegExp): string[] =>
  [...files].filter(([name]) => pattern.test(name)).map(([, path]) => path);

describe('the main job, by page', () => {
  it('a technician imports files by hand, the bad one is refused with its line, and lands on the result', async () => {
    await visit.signIn('technician');
    await visit.open('/t/charging/import');
    const page = new ImportPage(visit.page);
    await page.chooseFiles([...generated(/_[ln]-(qp|av)\.csv$/), ...generated(/_broken\.csv$/)]);
    await visit.page.getByText(/One file cannot be read/).waitFor();
    await page.openFile(/_broken/);
    await visit.page
      .getByText(/line \d+/i)
      .first()
      .waitFor();
    await page.fillTags({
      product: 'Larkspur 45 W bench adapter',
      hardware: 'A3',
      firmware: '1.1.0',
      state: '230 V 2.25 A',
      bench: 'Bench 2',
      unit: 'AD-0202',
    });
    await page.saveAndWait();
    await visit.page.getByRole('link', { name: 'Open the build' }).click();
    await visit.page.getByRole('heading', { name: 'A3 / 1.1.0' }).waitFor();
    await visit.page
      .getByText(/15[78](\.\d)? kHz/)
      .first()
      .waitFor();
  });

  it('a lead has it judged, and the drop is flagged with its cause', async () => {
    await visit.signIn('lead');
    await visit.open('/t/charging/products/adapter-45');
    await visit.page.getByRole('button', { name: 'Judge now' }).click();
    await visit.open('/t/charging/drops');
    const sentence = /Firmware 1\.1\.0 lost \d+\.\d dB on [LN] at 15[78](\.\d)? kHz/;
    await expectSoon(async () => {
      await visit.page.reload();
      return isShown(visit.page.getByText(sentence));
    });
  });

  it('an engineer opens the drop, takes it and moves it on', async () => {
    await visit.signIn('engineer');
    await visit.open('/t/charging/drops');
    await visit.page
      .getByRole('link', { name: /Firmware 1\.1\.0 lost/ })
      .first()
      .click();
    for (const question of ['Is it real?', 'Where?', 'How much is left?', 'What changed?', 'Who acts?']) {
      await visit.page.getByText(question).first().waitFor();
    }
    await visit.page.getByRole('button', { name: 'Take it' }).click();
    await visit.page.getByText('Ivo Brasted').first().waitFor();
    await visit.page.getByRole('radio', { name: 'Check it' }).check();
    await visit.page.getByRole('button', { name: 'Move the drop' }).click();
    await visit.page
      .getByText(/being checked/i)
      .first()
      .waitFor();
    await visit.page.reload();
    await visit.page.getByText('Ivo Brasted').first().waitFor();
  });

  it('a lead has the digest sent and finds it in the local mailbox, with the drop and a picture', async () => {
    await visit.signIn('lead');
    await visit.open('/t/charging/digest');
    await visit.page.getByRole('button', { name: 'Send me one now' }).click();
    await expectSoon(async () => {
      await visit.open('/mailbox');
      await visit.page.getByRole('heading', { name: 'Mailbox' }).waitFor();
      return isShown(visit.page.getByRole('link', { name: /Charging: \d+ new drop.*runa/ }));
    });
    await visit.page.getByRole('link', { name: /Charging: \d+ new drop.*runa/ }).click();
    const letter = visit.page.frameLocator('iframe');
    await letter
      .getByText(/Firmware 1\.1\.0 lost/)
      .first()
      .waitFor();
    const width = await letter
      .getByRole('img')
      .first()
      .evaluate((image: HTMLImageElement) => image.naturalWidth);
    expect(width).toBeGreaterThan(0);
  });

  it('a viewer sees the drop and may neither move it nor import', async () => {
    await visit.signIn('viewer');
    await visit.open('/t/charging/drops');
    await visit.page
      .getByRole('link', { name: /Firmware 1\.1\.0 lost/ })
      .first()
      .click();
    await visit.page.getByText('Who acts?').first().waitFor();
    expect(await visit.page.getByRole('button', { name: 'Take it' }).count()).toBe(0);
    expect(await visit.page.getByRole('button', { name: 'Move the drop' }).count()).toBe(0);
    await visit.open('/t/charging/import');
    await visit.page.getByText('A viewer cannot import sweeps').waitFor();
  });

  it('somebody of another team finds nothing there', async () => {
    await visit.signIn('stranger');
    await visit.open('/t/charging/drops');
    await visit.page.locator('h1').first().waitFor();
    expect(await isShown(visit.page.getByText(/Firmware 1\.1\.0 lost|Heronsway/))).toBe(false);
    const answers = await visit.page.evaluate(() =>
      Promise.all(
        [
          '/api/teams/charging/drops',
          '/api/v1/products/adapter-45',
          '/api/v1/products/adapter-45/drops',
          '/api/teams/charging/members',
        ].map(async (path) => (await fetch(path)).status),
      ),
    );
    expect(answers).toEqual([404, 404, 404, 404]);
  });
});

describe('the main job, by interface', () => {
  it('a bench sends sweeps with a token, has them judged, and a pipeline asks the gate', async () => {
    const token = await makeToken();
    const headers = { authorization: `Bearer ${token}` };
    const send = (file: { fileName: string; bytes: Uint8Array }, tags: object) => {
      const form = new FormData();
      form.set('file', new Blob([Uint8Array.from(file.bytes)]), file.fileName);
      form.set('tags', JSON.stringify(tags));
      return fetch(`${installation.url}/api/v1/sweeps`, { method: 'POST', headers, body: form });
    };
    const demoFiles = simulateDemoFiles(Date.now());
    for (const file of demoFiles.filter(({ tags }) => tags.length > 1)) {
      for (const tags of file.tags) expect((await send(file, tags)).status).toBe(201);
    }
    const [again] = demoFiles.filter(({ tags }) => tags.length > 1);
    const repeated = await send(again, again.tags[0]);
    expect(repeated.status).toBe(200);
    expect(await repeated.json()).toMatchObject({ duplicate: true });

    const [broken] = demoFiles.filter(({ fileName }) => fileName.includes('broken'));
    const refused = await send(broken, { ...again.tags[0], line: 'L', detector: 'QP', trace: 1 });
    expect(refused.status).toBe(422);
    expect(await refused.json()).toMatchObject({ type: '/problems/unreadable', line: expect.any(Number) as number });
    expect((await send(again, { ...again.tags[0], product: 'server-2400' })).status).toBe(404);

    const ask = async (path: string, method = 'GET') => {
      const response = await fetch(`${installation.url}/api/v1/products/adapter-45/${path}`, { method, headers });
      expect(response.status).toBe(200);
      return response;
    };
    const run = (await (await ask('evaluate?wait=true', 'POST')).json()) as { status: string; errors: unknown[] };
    expect(run).toMatchObject({ status: 'done', errors: [] });
    const build = 'hardware=A3&firmware=1.1.0';
    const gate = (await (await ask(`gate?${build}&targetMarginDb=6`)).json()) as { verdict: string };
    expect(gate.verdict).toBe('fail');
    expect(await (await ask(`gate?${build}&format=junit`)).text()).toContain('<testsuite');
    const drops = (await (await ask('drops')).json()) as { firmware: string; sentence: string }[];
    expect(drops.find(({ firmware }) => firmware === '1.1.0')?.sentence).toMatch(/2nd harmonic .* from 130 to 158 kHz/);
    const verdicts = (await (await ask(`verdicts?${build}`)).json()) as { verdict: string };
    expect(verdicts.verdict).toBe('lost');
    for (const path of ['builds', 'trend', 'margin-map']) await ask(path);
  });

  it('keeps what came in when both processes are killed in the middle of an import, and imports nothing twice', async () => {
    await visit.signIn('technician');
    await visit.open('/t/charging/import');
    const page = new ImportPage(visit.page);
    await page.chooseFiles(generated(/no-load.*_semicolon\.csv$/));
    await page.fillTags({
      product: 'Larkspur 45 W bench adapter',
      hardware: 'A3',
      firmware: '1.1.1',
      state: '230 V no load',
      bench: 'Bench 2',
    });
    await page.saveButton().click();
    await visit.page.waitForURL(/\/import\/\d+/);
    await installation.restartHard();
    await visit.page.reload();
    // A run that its worker held is given to another only when the lease is over.
    await visit.page.getByText(/^Finished/).waitFor({ timeout: LEASE_MS + 30_000 });
    await visit.page.getByRole('link', { name: 'Open the build' }).click();
    await visit.page.getByRole('heading', { name: 'A3 / 1.1.1' }).waitFor();
    const builds = (await visit.page.evaluate(async () =>
      (await fetch('/api/v1/products/adapter-45/builds')).json(),
    )) as { firmware: string; sweepCount: number }[];
    expect(builds.find(({ firmware }) => firmware === '1.1.1')?.sweepCount).toBe(6);
  });
});

/** Makes a token for a bench and a pipeline on the page of the lead. */
async function makeToken(): Promise<string> {
  await visit.signIn('lead');
  await visit.open('/t/charging/tokens');
  await visit.page.getByLabel('Name').fill('bench 2');
  for (const scope of ['sweeps:write', 'results:read', 'gate:read']) {
    await visit.page.getByRole('checkbox', { name: scope }).check();
  }
  await visit.page.getByRole('button', { name: 'Make the token' }).click();
  return visit.page.getByText(/^strand_\d+_[\w-]{43}$/).innerText();
}

/** Asks until it is so; a page that waits for a job has no event to wait for. */
async function expectSoon(isSo: () => Promise<boolean>): Promise<void> {
  const deadline = Date.now() + 60_000;
  while (!(await isSo())) {
    if (Date.now() > deadline) throw new Error('it did not come to that within a minute');
    await new Promise((resolve) => setTimeout(resolve, 300));
  }
}

/** Whether it shows within the time a page takes to load. */
async function isShown(what: Locator): Promise<boolean> {
  return what
    .first()
    .waitFor({ timeout: 2000 })
    .then(
      () => true,
      () => false,
    );
}
