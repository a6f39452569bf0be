import { HttpClient, provideHttpClient, withInterceptors } from '@angular/common/http';
import { HttpTestingController, provideHttpClientTesting } from '@angular/common/http/testing';
import { ChangeDetectionStrategy, Component } from '@angular/core';
import { TestBed } from '@angular/core/testing';
import { provideRouter, Router } from '@angular/router';
import { RouterTestingHarness } from '@angular/router/testing';
import type { SessionView } from '@shared/contracts/session';
import { CurrentTeam } from './current-team';
import { administratorsOnly, membersOnly, signedInOnly } from './session-guards';
import { SessionStore } from './session-store';
import { signInAgain } from './sign-in-again';
import { toLastTeam } from './to-last-team';

@Component({ template: '', changeDetection: ChangeDetectionStrategy.OnPush })
class Page {}

const MIRA: SessionView = {
  person: { id: 1, name: 'Mira', email: 'mira@quaywright.example', isAdministrator: false },
  teams: [
    { key: 'charging', name: 'Charging', role: 'technician', timeZone: 'Europe/Lisbon', targetMarginDb: 6 },
    { key: 'drives', name: 'Drives', role: 'lead', timeZone: 'Europe/Helsinki', targetMarginDb: 3 },
  ],
  demo: false,
  mailbox: false,
  demoSignIns: [],
};
const NOBODY: SessionView = { ...MIRA, person: null, teams: [] };

function setUp() {
  localStorage.clear();
  TestBed.configureTestingModule({
    providers: [
      provideHttpClient(withInterceptors([signInAgain])),
      provideHttpClientTesting(),
      provideRouter([
        { path: 'sign-in', component: Page },
        { path: 'not-found', component: Page },
        {
          path: '',
          canActivate: [signedInOnly],
          children: [
            { path: '', pathMatch: 'full', canActivate: [toLastTeam], component: Page },
            { path: 't/:team/:page', canActivate: [membersOnly], component: Page },
            { path: 'installation/teams', canActivate: [administratorsOnly], component: Page },
          ],
        },
      ]),
    ],
  });
  return { http: TestBed.inject(HttpTestingController), router: TestBed.inject(Router) };
}

async function openAs(session: SessionView, url: string) {
  const { http, router } = setUp();
  TestBed.inject(SessionStore).load().subscribe();
  http.expectOne('/api/csrf').flush({});
  http.expectOne('/api/session').flush(session);
  const harness = await RouterTestingHarness.create(url);
  return { http, router, harness };
}

describe('pages of the shell', () => {
  it('send a visitor to the sign-in page and remember where they wanted to go', async () => {
    const { router } = await openAs(NOBODY, '/t/charging/drops?state=new');
    expect(router.url).toBe('/sign-in?return=%2Ft%2Fcharging%2Fdrops%3Fstate%3Dnew');
  });

  it('open for a member and ask for the session only once', async () => {
    const { router, harness, http } = await openAs(MIRA, '/t/charging/drops');
    expect(router.url).toBe('/t/charging/drops');
    await harness.navigateByUrl('/t/drives/drops');
    http.verify();
    expect(TestBed.inject(CurrentTeam).timeZone()).toBe('Europe/Helsinki');
  });

  it("treat a foreign team's address as one that does not exist", async () => {
    const { router } = await openAs(MIRA, '/t/light/drops');
    expect(router.url).not.toContain('/t/light/drops');
  });

  it('keep the installation to administrators', async () => {
    const { router } = await openAs(MIRA, '/installation/teams');
    expect(router.url).not.toContain('installation');
  });

  it('lead from / to the team looked at last', async () => {
    const { router, harness } = await openAs(MIRA, '/t/drives/drops');
    TestBed.tick();
    await harness.navigateByUrl('/');
    expect(router.url).toBe('/t/drives/overview');
  });
});

describe('CurrentTeam', () => {
  it('answers what the person may do by the role in the team of the address', async () => {
    const { harness } = await openAs(MIRA, '/t/charging/drops');
    const team = TestBed.inject(CurrentTeam);
    expect([team.may('sweeps.add'), team.may('drops.triage'), team.may('audit.read')]).toEqual([true, false, false]);
    await harness.navigateByUrl('/t/drives/drops');
    expect([team.may('sweeps.add'), team.may('drops.triage'), team.may('audit.read')]).toEqual([true, true, true]);
  });
});

describe('a session that ends', () => {
  it('leads to the sign-in page and back on the first 401, and no second time', async () => {
    const { http, router, harness } = await openAs(MIRA, '/t/charging/drops');
    const client = TestBed.inject(HttpClient);
    for (const path of ['/api/a', '/api/b']) client.get(path).subscribe({ error: () => undefined });
    for (const path of ['/api/a', '/api/b'])
      http.expectOne(path).flush({}, { status: 401, statusText: 'Unauthorized' });
    await harness.fixture.whenStable();
    expect(router.url).toBe('/sign-in?return=%2Ft%2Fcharging%2Fdrops&ended=true');
    expect(TestBed.inject(SessionStore).person()).toBeNull();
  });

  it('is forgotten on signing out', async () => {
    const { http } = await openAs(MIRA, '/t/charging/drops');
    const session = TestBed.inject(SessionStore);
    let isOut = false;
    session.signOut().subscribe(() => (isOut = true));
    http.expectOne({ method: 'DELETE', url: '/api/session' }).flush(null, { status: 204, statusText: 'No Content' });
    expect(isOut).toBe(true);
    expect([session.person(), session.teams()]).toEqual([null, []]);
  });
});

it('asks again after the first question for the session failed', () => {
  const { http } = setUp();
  const session = TestBed.inject(SessionStore);
  session.load().subscribe({ error: () => undefined });
  http.expectOne('/api/csrf').error(new ProgressEvent('offline'));
  session.load().subscribe();
  http.expectOne('/api/csrf').flush({});
  http.expectOne('/api/session').flush(MIRA);
  expect(session.person()?.name).toBe('Mira');
});
