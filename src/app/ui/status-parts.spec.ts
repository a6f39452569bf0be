import { signal, Type } from '@angular/core';
import { TestBed } from '@angular/core/testing';
import { MatIconTestingModule } from '@angular/material/icon/testing';
import { MarginValue } from './margin-value';
import { ProblemBanner } from './problem-banner';
import { TimeStamp } from './time-stamp';
import { TEAM_TIME_ZONE } from './team-time-zone';
import { VerdictChip } from './verdict-chip';

async function show(part: Type<unknown>, inputs: Record<string, unknown>) {
  TestBed.configureTestingModule({
    imports: [MatIconTestingModule],
    providers: [{ provide: TEAM_TIME_ZONE, useValue: signal('Europe/Helsinki') }],
  });
  const fixture = TestBed.createComponent(part);
  for (const [name, value] of Object.entries(inputs)) fixture.componentRef.setInput(name, value);
  await fixture.whenStable();
  return fixture.nativeElement as HTMLElement;
}

describe('VerdictChip', () => {
  it.each([
    ['lost', 'lost'],
    ['held', 'held'],
    ['gained', 'gained'],
    ['cannotSay', 'cannot say'],
    [null, 'not judged'],
  ])('says %s as a word beside a glyph', async (verdict, word) => {
    const element = await show(VerdictChip, { verdict });
    expect(element.textContent?.trim()).toBe(word);
    expect(element.querySelector('mat-icon')).not.toBeNull();
  });

  it('states over limit beside any verdict', async () => {
    const element = await show(VerdictChip, { verdict: 'held', isOverLimit: true });
    expect([...element.querySelectorAll('.chip')].map(({ textContent }) => textContent)).toEqual([
      'over limit',
      'held',
    ]);
  });
});

describe('MarginValue', () => {
  it('marks a margin over the limit by word and glyph, not by colour alone', async () => {
    const element = await show(MarginValue, { marginDb: -3.24, targetMarginDb: 6 });
    expect(element.textContent).toContain('-3.2 dB');
    expect(element.textContent).toContain('over limit');
    expect(element.querySelector('mat-icon')).not.toBeNull();
  });

  it('compares before rounding: -0.04 dB is over the limit and 5.96 dB is below a target of 6', async () => {
    const over = await show(MarginValue, { marginDb: -0.04 });
    expect(over.className).toContain('over');
    TestBed.resetTestingModule();
    const tight = await show(MarginValue, { marginDb: 5.96, targetMarginDb: 6 });
    expect(tight.textContent).toContain('below the target of 6.0 dB');
  });

  it('says not measured instead of a number', async () => {
    expect((await show(MarginValue, { marginDb: null })).textContent?.trim()).toBe('not measured');
  });
});

describe('TimeStamp', () => {
  it("writes the time in the team's zone and names the zone on hover", async () => {
    const element = await show(TimeStamp, { at: '2026-03-02T09:20:05Z' });
    const time = element.querySelector('time');
    expect(time?.textContent).toBe('2 Mar 2026, 11:20');
    expect(time?.title).toBe('2 Mar 2026, 11:20:05 Europe/Helsinki');
    expect(time?.dateTime).toBe('2026-03-02T09:20:05.000Z');
  });
});

describe('ProblemBanner', () => {
  it('says what happened and where, what was kept and what to do', async () => {
    const element = await show(ProblemBanner, {
      problem: {
        type: '/problems/unreadable',
        title: 'Unreadable',
        status: 422,
        detail: 'sweep.csv cannot be read.',
        line: 14,
        column: 3,
        found: 'n/a',
        expected: 'a level',
        advice: 'Check the decimal mark.',
      },
      kept: 'Nothing was stored.',
    });
    expect([...element.querySelectorAll('p')].map(({ textContent }) => textContent?.trim())).toEqual([
      'sweep.csv cannot be read.',
      'Line 14, column 3: found "n/a", expected a level',
      'Nothing was stored.',
      'Check the decimal mark.',
    ]);
    expect(element.getAttribute('role')).toBe('alert');
  });

  it('does not repeat errors that stand beside their fields', async () => {
    const element = await show(ProblemBanner, {
      problem: {
        type: '/problems/invalid',
        title: 'Not valid',
        status: 400,
        detail: 'email: is no e-mail address',
        errors: [
          { path: 'email', message: 'is no e-mail address' },
          { path: 'tags.bench', message: 'does not exist' },
        ],
      },
      shownPaths: ['email'],
    });
    expect([...element.querySelectorAll('p')].map(({ textContent }) => textContent?.trim())).toEqual([
      'Some fields need another look.',
      'tags.bench: does not exist',
    ]);
  });
});
