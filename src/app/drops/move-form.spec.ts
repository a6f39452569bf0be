import { provideHttpClient } from '@angular/common/http';
import { HttpTestingController, provideHttpClientTesting } from '@angular/common/http/testing';
import { TestBed } from '@angular/core/testing';
import { MatIconTestingModule } from '@angular/material/icon/testing';
import type { DropView } from '@shared/contracts/drops';
import { dropView } from '../../../test/builders/drop-builder';
import { MoveForm } from './move-form';

async function show(drop = dropView()) {
  TestBed.configureTestingModule({
    imports: [MatIconTestingModule],
    providers: [provideHttpClient(), provideHttpClientTesting()],
  });
  const fixture = TestBed.createComponent(MoveForm);
  fixture.componentRef.setInput('drop', drop);
  const moved: DropView[] = [];
  fixture.componentInstance.moved.subscribe((answer) => moved.push(answer));
  await fixture.whenStable();
  const element = fixture.nativeElement as HTMLElement;
  const http = TestBed.inject(HttpTestingController);
  return {
    element,
    http,
    moved,
    choose: (words: string) => {
      const radio = [...element.querySelectorAll('mat-radio-button')].find(({ textContent }) =>
        textContent?.includes(words),
      );
      radio?.querySelector('input')?.click();
      TestBed.tick();
    },
    write: (note: string) => {
      const field = element.querySelector('textarea') as HTMLTextAreaElement;
      field.value = note;
      field.dispatchEvent(new Event('input'));
    },
    send: async () => {
      element.querySelector('form')?.dispatchEvent(new Event('submit'));
      await fixture.whenStable();
    },
    settle: () => fixture.whenStable(),
  };
}

const MOVES = { method: 'POST', url: '/api/v1/drops/4/moves' };

it('offers only the moves the server allows', async () => {
  const { element } = await show(dropView({ state: 'accepted', moves: ['checking'] }));
  expect([...element.querySelectorAll('mat-radio-button')].map(({ textContent }) => textContent?.trim())).toEqual([
    'Open it again',
  ]);
});

it('asks for the reason of an acceptance before it asks the server', async () => {
  const { element, http, choose, send } = await show();
  choose('Accept it');
  await send();
  http.expectNone(MOVES);
  expect(element.querySelector('mat-error')?.textContent).toBe('Please fill this in.');
});

it('hands on what the server made of the move, and nothing before', async () => {
  const { http, moved, choose, write, send } = await show();
  choose('The cause is known');
  write('  PFC at 78 kHz ');
  await send();
  expect(moved).toEqual([]);
  const request = http.expectOne(MOVES);
  expect(request.request.body).toEqual({ state: 'causeKnown', note: 'PFC at 78 kHz' });
  const answer = dropView({ state: 'causeKnown' });
  request.flush(answer);
  expect(moved).toEqual([answer]);
});

it('keeps what was typed when the server refuses, and says why', async () => {
  const { element, http, moved, choose, write, send, settle } = await show();
  choose('Accept it');
  write('Only with the 120 V lead.');
  await send();
  http.expectOne(MOVES).flush(
    {
      type: '/problems/conflict',
      title: 'Conflict',
      status: 409,
      detail: 'a drop that is fixed cannot become accepted',
    },
    { status: 409, statusText: 'Conflict' },
  );
  await settle();
  expect(element.querySelector('app-problem-banner')?.textContent).toContain('cannot become accepted');
  expect(element.querySelector('textarea')?.value).toBe('Only with the 120 V lead.');
  expect(moved).toEqual([]);
});

it('says that a fix needs a newer build where there is none', async () => {
  const { element, http, choose, settle } = await show();
  choose('It is fixed');
  http
    .expectOne('/api/v1/products/charger-750/builds?team=charging')
    .flush([
      { id: 16, position: 9, sweepCount: 6, hardware: 'C2', firmware: '4.1.0', verdict: 'lost', worstMarginDb: -2.5 },
    ]);
  await settle();
  expect(element.textContent).toContain('No build after this one is measured yet');
  expect(element.querySelector('button[type=submit]')).toBeNull();
});
