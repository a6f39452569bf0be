import { provideHttpClient } from '@angular/common/http';
import { HttpTestingController, provideHttpClientTesting } from '@angular/common/http/testing';
import { signal } from '@angular/core';
import { TestBed } from '@angular/core/testing';
import { MatIconTestingModule } from '@angular/material/icon/testing';
import { provideRouter } from '@angular/router';
import type { BenchView } from '@shared/contracts/benches';
import { CurrentTeam } from '../session/current-team';
import { BenchesPage } from './benches-page';

const bench: BenchView = {
  key: 'bench-1',
  name: 'Bench 1',
  location: 'Hall B',
  lisn: '50 uH',
  receiver: 'EMI receiver',
  notes: '',
  isArchived: false,
  sweepCount: 12,
  lastSweepAt: '2026-03-02T08:20:00.000Z',
  spread: { sdDb: 0.7, degreesOfFreedom: 4, source: 'planning value' },
};

async function open(mayEdit: boolean) {
  TestBed.configureTestingModule({
    imports: [MatIconTestingModule],
    providers: [
      provideHttpClient(),
      provideHttpClientTesting(),
      provideRouter([]),
      { provide: CurrentTeam, useValue: { may: () => mayEdit, timeZone: signal('UTC') } },
    ],
  });
  const fixture = TestBed.createComponent(BenchesPage);
  fixture.componentRef.setInput('team', 'power');
  const http = TestBed.inject(HttpTestingController);
  fixture.detectChanges();
  http.expectOne('/api/teams/power/benches').flush([bench]);
  await fixture.whenStable();
  const element = fixture.nativeElement as HTMLElement;
  const press = async (words: string) => {
    [...element.querySelectorAll('button')].find(({ textContent }) => textContent?.trim().includes(words))?.click();
    await fixture.whenStable();
  };
  const type = async (field: string, text: string) => {
    const input = element.querySelector<HTMLInputElement>(`[formcontrolname="${field}"]`);
    if (!input) throw new Error(`no field ${field}`);
    input.value = text;
    input.dispatchEvent(new Event('input'));
    await fixture.whenStable();
    return input;
  };
  return { fixture, http, element, press, type };
}

describe('BenchesPage', () => {
  it('shows the cautions and the spread with its source to everybody, and no way to change anything to a viewer', async () => {
    const { element } = await open(false);
    expect(element.textContent).toContain('hundreds of mA into protective earth');
    expect(element.textContent).toContain('0.7 dB standard deviation of runs, 4 degrees of freedom');
    expect(element.textContent).toContain('planning value');
    expect(element.querySelectorAll('button')).toHaveLength(0);
  });

  it('keeps what was typed when the server refuses a new bench, with the reason beside the field', async () => {
    const { fixture, http, element, press, type } = await open(true);
    await press('Add a bench');
    await type('name', 'Bench 1');
    await press('Add the bench');
    const request = http.expectOne({ method: 'POST', url: '/api/teams/power/benches' });
    expect(request.request.body).toMatchObject({ name: 'Bench 1', key: 'bench-1' });
    request.flush(
      { type: '/problems/conflict', title: '', status: 409, detail: 'key: the team has a bench "bench-1" already' },
      { status: 409, statusText: 'Conflict' },
    );
    await fixture.whenStable();
    expect(element.querySelector('mat-error')?.textContent).toContain('The team has a bench "bench-1" already');
    expect(element.querySelector('app-problem-banner')).toBeNull();
    expect(element.querySelector<HTMLInputElement>('[formcontrolname="name"]')?.value).toBe('Bench 1');
  });

  it('leaves a key alone that somebody typed', async () => {
    const { press, type } = await open(true);
    await press('Add a bench');
    const key = await type('key', 'b7');
    await type('name', 'Bench 7');
    expect(key.value).toBe('b7');
  });

  it('takes a bench out of use without touching what it measured', async () => {
    const { http, press } = await open(true);
    await press('Archive');
    const request = http.expectOne({ method: 'PATCH', url: '/api/teams/power/benches/bench-1' });
    expect(request.request.body).toEqual({ isArchived: true });
  });
});
