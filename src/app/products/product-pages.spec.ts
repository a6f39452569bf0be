import { provideHttpClient } from '@angular/common/http';
import { HttpTestingController, provideHttpClientTesting, TestRequest } from '@angular/common/http/testing';
import { signal } from '@angular/core';
import { TestBed } from '@angular/core/testing';
import { MatIconTestingModule } from '@angular/material/icon/testing';
import { NavigationEnd, provideRouter, Router, withComponentInputBinding, withRouterConfig } from '@angular/router';
import { RouterTestingHarness } from '@angular/router/testing';
import type { BuildSummary, BuildView } from '@shared/contracts/builds';
import type { TrendView } from '@shared/contracts/margins';
import type { ProductView } from '@shared/contracts/products';
import { type Action, leastRole } from '@shared/access/permissions';
import { isAtLeast, type Role } from '@shared/access/roles';
import { filter, firstValueFrom } from 'rxjs';
import { CurrentTeam } from '../session/current-team';
import { CHART_ENGINE } from '../ui/chart/chart-engine';
import { productsRoutes } from './products-routes';

const API = '/api/v1/products/charger-750';

const product = {
  key: 'charger-750',
  name: 'Heronsway charger',
  team: 'charging',
  teamName: 'Charging',
  isShared: false,
  limitSetKey: 'CISPR32_B',
  targetMarginDb: 3,
  ownTargetMarginDb: null,
  buildCount: 3,
  latestBuild: null,
  openDrops: 0,
  unmeasuredStates: [],
  description: '',
  states: [{ id: 1, name: 'full load' }],
  units: [],
  lines: ['L', 'N'],
  detectors: ['QP', 'AV'],
  reference: {
    buildId: 1,
    hardware: 'C2',
    firmware: '1.0',
    chosenBy: '',
    chosenAt: '2026-10-04T00:00:00Z',
    reason: '',
  },
  sharedWith: [],
} as unknown as ProductView;

const builds = [1, 2, 3].map((id): BuildSummary => ({
  id,
  position: id,
  hardware: 'C2',
  firmware: `1.${id - 1}`,
  commit: '',
  builtAt: `2026-1${id - 1}-01T08:00:30.000Z`,
  sweepCount: 18,
  worstMarginDb: 4,
  worstFrequencyHz: 156_000,
  verdict: 'held',
  isOverLimit: false,
  isStale: false,
  isReference: id === 1,
  openDrops: 0,
  unmeasuredStates: [],
}));

interface Opened {
  page: HTMLElement;
  http: HttpTestingController;
  /** The request of a path that waits now, if there is one. */
  waiting: (url: string) => TestRequest[];
  answer: (url: string, body: object) => Promise<TestRequest>;
  press: (name: RegExp) => Promise<void>;
}

/** Lets what waits for answered requests run; a page is never stable while it waits for others. */
async function settle(): Promise<void> {
  for (let turn = 0; turn < 30; turn++) {
    await Promise.resolve();
    TestBed.tick();
  }
}

async function open(path: string, role: Role = 'lead'): Promise<Opened> {
  const may = (action: Action) => isAtLeast(role, leastRole(action));
  TestBed.configureTestingModule({
    imports: [MatIconTestingModule],
    providers: [
      provideHttpClient(),
      provideHttpClientTesting(),
      provideRouter(
        [{ path: 't/:team/products', children: productsRoutes }],
        withComponentInputBinding(),
        withRouterConfig({ paramsInheritanceStrategy: 'always' }),
      ),
      { provide: CHART_ENGINE, useValue: () => new Promise<never>(() => undefined) },
      { provide: CurrentTeam, useValue: { may, timeZone: signal('UTC'), targetMarginDb: signal(6) } },
    ],
  });
  const harness = await RouterTestingHarness.create(path);
  await settle();
  const http = TestBed.inject(HttpTestingController);
  const page = harness.fixture.nativeElement as HTMLElement;
  const waiting = (url: string) => http.match((request) => request.url === url);
  return {
    page,
    http,
    waiting,
    answer: async (url, body) => {
      const [request, ...others] = waiting(url);
      for (const one of [request, ...others]) if (!one.cancelled) one.flush(body);
      await settle();
      return request;
    },
    press: async (name) => {
      const button = [...page.querySelectorAll('button')].find((one) =>
        name.test(one.getAttribute('aria-label') ?? one.textContent),
      );
      if (!button) throw new Error(`There is no button ${String(name)}.`);
      button.click();
      await settle();
    },
  };
}

const text = ({ page }: Opened) => page.textContent.replace(/\s+/g, ' ');

describe('a product that another team owns', () => {
  it('is asked for with its owner, and its links keep the owner', async () => {
    const opened = await open('/t/drives/products/charger-750/builds?owner=charging');
    const request = await opened.answer(API, { ...product, isShared: true });
    await opened.answer(`${API}/builds`, builds);
    expect(request.request.params.get('team')).toBe('charging');
    expect(opened.page.querySelector('th a')?.getAttribute('href')).toBe(
      '/t/drives/products/charger-750/builds/3?owner=charging',
    );
  });

  it('offers no act, not even to a lead, and says why', async () => {
    const opened = await open('/t/drives/products/charger-750/settings?owner=charging');
    await opened.answer(API, { ...product, isShared: true });
    await opened.answer(`${API}/builds`, builds);
    expect(text(opened)).toContain('shared with your team to read only');
    expect(opened.page.querySelector('form')).toBeNull();
    expect(text(opened)).not.toContain('Judge now');
  });
});

describe('the builds of a product', () => {
  it('stand newest first with the reference marked', async () => {
    const opened = await open('/t/charging/products/charger-750/builds');
    await opened.answer(API, product);
    await opened.answer(`${API}/builds`, builds);
    const names = [...opened.page.querySelectorAll('tbody th a')].map((link) => link.textContent.trim());
    expect(names).toEqual(['C2 / 1.2', 'C2 / 1.1', 'C2 / 1.0']);
    expect(opened.page.querySelector('tr.reference')?.textContent).toContain('C2 / 1.0');
  });

  it('let a lead choose another reference and a technician only add builds', async () => {
    const lead = await open('/t/charging/products/charger-750/builds');
    await lead.answer(API, product);
    await lead.answer(`${API}/builds`, builds);
    expect(lead.page.querySelectorAll('td.acts button')).toHaveLength(2);

    TestBed.resetTestingModule();
    const technician = await open('/t/charging/products/charger-750/builds', 'technician');
    await technician.answer(API, product);
    await technician.answer(`${API}/builds`, builds);
    expect(technician.page.querySelectorAll('td.acts button')).toHaveLength(0);
    const add = [...technician.page.querySelectorAll('button')].find((one) => one.textContent.includes('Add a build'));
    expect(add?.getAttribute('aria-disabled')).not.toBe('true');
  });

  it('say what failed and load again on demand', async () => {
    const opened = await open('/t/charging/products/charger-750/builds');
    await opened.answer(API, product);
    const [failed] = opened.waiting(`${API}/builds`);
    failed.flush(
      { type: '/problems/internal', title: '', status: 500, detail: 'The disk is full.' },
      { status: 500, statusText: 'Internal' },
    );
    await settle();
    expect(text(opened)).toContain('The disk is full.');
    await opened.press(/Try again/);
    await opened.answer(API, product);
    await opened.answer(`${API}/builds`, builds);
    expect(opened.page.querySelectorAll('tbody tr')).toHaveLength(3);
  });
});

describe('the trend of a product', () => {
  const trend = {
    product: 'charger-750',
    limitSetKey: 'CISPR32_B',
    targetMarginDb: 3,
    band: null,
    bands: ['0.15-0.5 MHz', '0.5-5 MHz'],
    referenceBuildId: 1,
    points: [],
  } satisfies TrendView;

  it('asks for what the address says and leaves out names that the product does not have', async () => {
    const opened = await open('/t/charging/products/charger-750/trend?line=L&detector=PK');
    await opened.answer(API, product);
    const { request } = await opened.answer(`${API}/trend`, trend);
    expect(request.params.toString()).toBe('team=charging&line=L');
  });

  it('asks once for each band when there is one line for each', async () => {
    const opened = await open('/t/charging/products/charger-750/trend?split=band');
    await opened.answer(API, product);
    await opened.answer(`${API}/trend`, trend);
    const asked = opened.waiting(`${API}/trend`).map(({ request }) => request.params.get('band'));
    expect(asked).toEqual(['0.15-0.5 MHz', '0.5-5 MHz']);
  });

  it('does not ask twice for the whole range', async () => {
    const opened = await open('/t/charging/products/charger-750/trend');
    await opened.answer(API, product);
    await opened.answer(`${API}/trend`, trend);
    expect(opened.waiting(`${API}/trend`)).toEqual([]);
  });
});

describe('the overlay of a product', () => {
  const sweeps = {
    sweeps: [{ kind: 'product', state: 'full load', line: 'N', detector: 'AV', worst: { marginDb: 1 } }],
    nextBefore: null,
  };

  it('lays the newest build, the reference and the one before over each other, in the series closest to the limit', async () => {
    const opened = await open('/t/charging/products/charger-750/overlay');
    await opened.answer(API, product);
    await opened.answer(`${API}/builds`, builds);
    expect(opened.waiting('/api/v1/overlay')).toEqual([]);
    const { request: lead } = await opened.answer('/api/v1/sweeps', sweeps);
    expect(lead.params.get('build')).toBe('3');
    const [overlay] = opened.waiting('/api/v1/overlay');
    const asked = Object.fromEntries(
      overlay.request.params.keys().map((key) => [key, overlay.request.params.get(key)]),
    );
    expect(asked).toMatchObject({ builds: '3,1,2', state: 'full load', line: 'N', detector: 'AV', kind: 'product' });
  });

  it('opens lines and detectors where they stand together, and adds the background', async () => {
    const opened = await open(
      '/t/charging/products/charger-750/overlay?builds=2&together=lines,detectors&background=on',
    );
    await opened.answer(API, product);
    await opened.answer(`${API}/builds`, builds);
    await opened.answer('/api/v1/sweeps', sweeps);
    const [{ request }] = opened.waiting('/api/v1/overlay');
    expect([request.params.get('builds'), request.params.get('state'), request.params.get('kind')]).toEqual([
      '2',
      'full load',
      'background',
    ]);
    expect([request.params.has('line'), request.params.has('detector')]).toEqual([false, false]);
  });

  it('keeps a change of the builds in the address', async () => {
    const opened = await open('/t/charging/products/charger-750/overlay?line=L');
    await opened.answer(API, product);
    await opened.answer(`${API}/builds`, builds);
    const arrived = firstValueFrom(
      TestBed.inject(Router).events.pipe(filter((event) => event instanceof NavigationEnd)),
    );
    await opened.press(/^Take 1\.1 out/);
    const { url } = await arrived;
    expect(decodeURIComponent(url)).toBe('/t/charging/products/charger-750/overlay?line=L&builds=3,1');
  });
});

describe('judging on demand', () => {
  beforeEach(() => jest.useFakeTimers());
  afterEach(() => jest.useRealTimers());

  it('follows the run to its end and then loads the product again', async () => {
    const opened = await open('/t/charging/products/charger-750/builds');
    await opened.answer(API, product);
    await opened.answer(`${API}/builds`, builds);
    const run = { id: 7, status: 'running', total: 4, done: 1, errors: [] };
    await opened.press(/Judge now/);
    const { request } = await opened.answer('/api/teams/charging/judge', { runs: [run] });
    expect(request.body).toEqual({ product: 'charger-750' });
    await jest.advanceTimersByTimeAsync(0);
    await opened.answer('/api/v1/runs/7', run);
    expect(text(opened)).toContain('Judging: 1 of 4 builds.');
    await jest.advanceTimersByTimeAsync(1000);
    await opened.answer('/api/v1/runs/7', { ...run, status: 'done', done: 4 });
    expect(text(opened)).toContain('4 builds judged.');
    expect(opened.waiting(`${API}/builds`)).toHaveLength(1);
  });
});

describe('the page of a build', () => {
  const build: BuildView = {
    ...builds[1],
    hardwareNotes: '',
    firmwareNotes: '',
    notes: '',
    switching: [],
    parameters: [],
    judgedAt: null,
    previous: { id: 1, hardware: 'C2', firmware: '1.0' },
    next: { id: 3, hardware: 'C2', firmware: '1.2' },
  };

  it('opens with the answer, leads to its neighbours, and names the drops it shows only', async () => {
    const opened = await open('/t/charging/products/charger-750/builds/2');
    await opened.answer(API, product);
    await opened.answer(`${API}/builds/2`, build);
    await opened.answer(`${API}/verdicts`, { buildId: 2, verdicts: [], referenceBuilds: [], isStale: true });
    const seenIn = [{ buildId: 2, marginDb: 1, differenceDb: -4, isOverLimit: false }];
    const drop = { id: 1, buildId: 2, state: 'new', sentence: 'Mine.', witnesses: [], seenIn };
    const elsewhere = { ...drop, id: 2, buildId: 3, seenIn: [{ ...seenIn[0], buildId: 3 }] };
    await opened.answer(`${API}/drops`, [drop, elsewhere, { ...drop, id: 3, state: 'withdrawn' }]);
    expect(text(opened)).toContain('Not judged yet');
    expect(text(opened)).toContain('One drop');
    const neighbours = [...opened.page.querySelectorAll('a[rel]')].map((link) => link.getAttribute('href'));
    expect(neighbours).toEqual([
      '/t/charging/products/charger-750/builds/1',
      '/t/charging/products/charger-750/builds/3',
    ]);
  });
});
