import { provideHttpClient } from '@angular/common/http';
import { HttpTestingController, provideHttpClientTesting } from '@angular/common/http/testing';
import { TestBed } from '@angular/core/testing';
import { MatIconTestingModule } from '@angular/material/icon/testing';
import { provideRouter } from '@angular/router';
import { dropView, sighting } from '../../../test/builders/drop-builder';
import { DropsPage } from './drops-page';

function show(query: Record<string, string> = {}) {
  TestBed.configureTestingModule({
    imports: [MatIconTestingModule],
    providers: [provideHttpClient(), provideHttpClientTesting(), provideRouter([])],
  });
  const fixture = TestBed.createComponent(DropsPage);
  fixture.componentRef.setInput('team', 'charging');
  for (const [name, value] of Object.entries(query)) fixture.componentRef.setInput(name, value);
  TestBed.tick();
  const http = TestBed.inject(HttpTestingController);
  http.expectOne('/api/teams/charging/members').flush({ members: [], invitations: [] });
  return { fixture, http, element: fixture.nativeElement as HTMLElement };
}

const PRODUCTS = '/api/v1/products?team=charging';

it('lists drops in the order of the server with what is left in the newest build that shows them', async () => {
  const { fixture, http, element } = show();
  http.expectOne(PRODUCTS).flush([]);
  const still = dropView({ id: 1, latest: sighting({ buildId: 18, firmware: '4.2.0', marginDb: -3.1 }) });
  http.expectOne('/api/teams/charging/drops?state=open').flush([still, dropView({ id: 2 })]);
  await fixture.whenStable();
  const rows = [...element.querySelectorAll('tbody tr')];
  expect(rows.map((row) => row.querySelector('a')?.getAttribute('href'))).toEqual([
    '/t/charging/drops/1',
    '/t/charging/drops/2',
  ]);
  expect(rows[0].textContent).toContain('-3.1 dB');
  expect(rows[0].textContent).toContain('still in C2 / 4.2.0');
  expect(element.querySelector('app-page-header')?.textContent).toContain('2 open drops, both over the limit');
});

it('asks for the drops of a shared product with the team that owns it', async () => {
  const { fixture, http } = show({ product: 'psu-240', state: 'all', owner: 'me' });
  http.expectOne(PRODUCTS).flush([{ key: 'psu-240', name: 'Supply', team: 'server-power', isShared: true }]);
  // The page is not stable before the second answer: let the first arrive, then draw.
  await new Promise((resolve) => setTimeout(resolve));
  TestBed.tick();
  http.expectOne('/api/v1/products/psu-240/drops?owner=me&team=server-power').flush([]);
  await fixture.whenStable();
  expect((fixture.nativeElement as HTMLElement).textContent).toContain('No drop fits this choice');
});

it('says what will appear here while no drop is open', async () => {
  const { fixture, http, element } = show();
  http.expectOne(PRODUCTS).flush([]);
  http.expectOne('/api/teams/charging/drops?state=open').flush([]);
  await fixture.whenStable();
  expect(element.querySelector('app-empty-state')?.textContent).toContain('A drop is raised when');
});
