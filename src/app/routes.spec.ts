import { provideHttpClient } from '@angular/common/http';
import { HttpTestingController, provideHttpClientTesting } from '@angular/common/http/testing';
import { TestBed } from '@angular/core/testing';
import { MatIconTestingModule } from '@angular/material/icon/testing';
import { provideRouter, Router, withRouterConfig } from '@angular/router';
import { RouterTestingHarness } from '@angular/router/testing';
import type { SessionView } from '@shared/contracts/session';
import { routes } from './routes';
import { SessionStore } from './session/session-store';

const VISITOR: SessionView = { person: null, teams: [], demo: false, mailbox: false, demoSignIns: [] };
const NEWCOMER: SessionView = {
  ...VISITOR,
  person: { id: 1, name: 'Mira', email: 'mira@quaywright.example', isAdministrator: false },
};
const MEMBER: SessionView = {
  ...NEWCOMER,
  teams: [{ key: 'charging', name: 'Charging', role: 'viewer', timeZone: 'UTC', targetMarginDb: 6 }],
};

async function open(session: SessionView, url: string) {
  localStorage.clear();
  TestBed.configureTestingModule({
    imports: [MatIconTestingModule],
    providers: [
      provideHttpClient(),
      provideHttpClientTesting(),
      provideRouter(routes, withRouterConfig({ paramsInheritanceStrategy: 'always' })),
    ],
  });
  const http = TestBed.inject(HttpTestingController);
  TestBed.inject(SessionStore).load().subscribe();
  http.expectOne('/api/csrf').flush({});
  http.expectOne('/api/session').flush(session);
  const harness = await RouterTestingHarness.create(url);
  return { url: TestBed.inject(Router).url, text: harness.routeNativeElement?.textContent ?? '' };
}

beforeAll(() => {
  window.matchMedia = (media) =>
    ({
      matches: false,
      media,
      addListener: () => undefined,
      removeListener: () => undefined,
    }) as unknown as MediaQueryList;
});

it('leads a visitor from / to the sign-in page', async () => {
  expect((await open(VISITOR, '/')).url).toBe('/sign-in');
});

it('leads a person without a team from / to what to do next', async () => {
  const page = await open(NEWCOMER, '/');
  expect(page.url).toBe('/');
  expect(page.text).toContain('You are in no team yet');
});

it('leads a signed-in person away from the sign-in page', async () => {
  expect((await open(NEWCOMER, '/sign-in')).url).toBe('/');
});

it.each(['/nowhere', '/t/charging/nowhere', '/t/foreign/drops', '/installation/people'])(
  'answers %s inside the shell when there is nothing to see',
  async (address) => {
    const page = await open(MEMBER, address);
    expect(page.text).toContain('There is no such page');
    expect(page.text).toContain('Pre-compliance results');
  },
);
