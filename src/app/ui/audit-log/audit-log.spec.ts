import { provideHttpClient } from '@angular/common/http';
import { HttpTestingController, provideHttpClientTesting } from '@angular/common/http/testing';
import { TestBed } from '@angular/core/testing';
import { MatIconTestingModule } from '@angular/material/icon/testing';
import type { AuditEntryView } from '@shared/contracts/audit';
import { AuditLog } from './audit-log';

const PATH = '/api/teams/charging/audit';
const entry = (id: number, summary: string): AuditEntryView => ({
  id,
  at: '2026-12-01T15:25:00.000Z',
  actor: 'Runa Fellgarth',
  actorKind: 'person',
  action: 'member.roleChanged',
  subjectKind: 'person',
  subjectId: '3',
  summary,
  details: { before: { role: 'viewer' }, now: { role: 'engineer' } },
});

async function show() {
  TestBed.configureTestingModule({
    imports: [MatIconTestingModule],
    providers: [provideHttpClient(), provideHttpClientTesting()],
  });
  const fixture = TestBed.createComponent(AuditLog);
  fixture.componentRef.setInput('path', PATH);
  TestBed.tick();
  const http = TestBed.inject(HttpTestingController);
  http.expectOne(PATH).flush({ entries: [entry(9, 'Ivo is engineer now')], nextBefore: 9 });
  await fixture.whenStable();
  const element = fixture.nativeElement as HTMLElement;
  const summaries = () => [...element.querySelectorAll('summary')].map(({ textContent }) => textContent);
  return { fixture, http, element, summaries };
}

it('goes on where the page before ended, until there is nothing older', async () => {
  const { fixture, http, element, summaries } = await show();
  element.querySelector('button')?.click();
  http.expectOne(`${PATH}?before=9`).flush({ entries: [entry(8, 'Tamsin is engineer now')], nextBefore: null });
  await fixture.whenStable();
  expect(summaries()).toEqual(['Ivo is engineer now', 'Tamsin is engineer now']);
  expect(element.querySelector('button')).toBeNull();
});

it('searches what is loaded, and offers to search on', async () => {
  const { fixture, element, summaries } = await show();
  const field = element.querySelector('input') as HTMLInputElement;
  field.value = 'tamsin';
  field.dispatchEvent(new Event('input'));
  await fixture.whenStable();
  expect(summaries()).toEqual([]);
  expect(element.querySelector('button')?.textContent?.trim()).toBe('Search older entries too');
});

it('keeps what was loaded when older entries cannot be read', async () => {
  const { fixture, http, element, summaries } = await show();
  element.querySelector('button')?.click();
  http.expectOne(`${PATH}?before=9`).error(new ProgressEvent('offline'));
  await fixture.whenStable();
  expect(summaries()).toEqual(['Ivo is engineer now']);
  expect(element.querySelector('app-problem-banner')?.textContent).toContain('still here');
});

it('shows old and new values side by side', async () => {
  const { element } = await show();
  expect([...element.querySelectorAll('tbody td')].map(({ textContent }) => textContent)).toEqual([
    'viewer',
    'engineer',
  ]);
});
