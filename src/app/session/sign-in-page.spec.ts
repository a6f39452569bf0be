import { provideHttpClient } from '@angular/common/http';
import { HttpTestingController, provideHttpClientTesting } from '@angular/common/http/testing';
import { ComponentFixture, TestBed } from '@angular/core/testing';
import { MatIconTestingModule } from '@angular/material/icon/testing';
import { provideRouter, Router } from '@angular/router';
import type { SessionView } from '@shared/contracts/session';
import { SessionStore } from './session-store';
import { SignInPage } from './sign-in-page';

const NOBODY: SessionView = { person: null, teams: [], demo: false, mailbox: false, demoSignIns: [] };
const TEO = { email: 'teo@quaywright.example', name: 'Teo', role: 'technician', password: 'open water' };

async function show(session: SessionView, inputs: Record<string, string> = {}) {
  TestBed.configureTestingModule({
    imports: [MatIconTestingModule],
    providers: [provideHttpClient(), provideHttpClientTesting(), provideRouter([])],
  });
  const http = TestBed.inject(HttpTestingController);
  TestBed.inject(SessionStore).load().subscribe();
  http.expectOne('/api/csrf').flush({});
  http.expectOne('/api/session').flush(session);
  const fixture = TestBed.createComponent(SignInPage);
  for (const [name, value] of Object.entries(inputs)) fixture.componentRef.setInput(name, value);
  await fixture.whenStable();
  return { fixture, http, element: fixture.nativeElement as HTMLElement };
}

async function fillInAndSend(fixture: ComponentFixture<SignInPage>, email: string, password: string) {
  const element = fixture.nativeElement as HTMLElement;
  const inputs = element.querySelectorAll('input');
  [email, password].forEach((text, i) => {
    inputs[i].value = text;
    inputs[i].dispatchEvent(new Event('input'));
  });
  element.querySelector('form')?.dispatchEvent(new Event('submit'));
  await fixture.whenStable();
}

describe('SignInPage', () => {
  it('shows demo sign-ins and the mailbox only in the demo', async () => {
    const real = await show(NOBODY);
    expect(real.element.textContent).not.toContain('demo');
    TestBed.resetTestingModule();
    const demo = await show({ ...NOBODY, demo: true, mailbox: true, demoSignIns: [TEO] });
    expect(demo.element.querySelector('app-demo-sign-ins')?.textContent).toContain('Teo');
    expect(demo.element.querySelector('a[href="/mailbox"]')).not.toBeNull();
  });

  it('signs in as a demo person with one click', async () => {
    const { element, http } = await show({ ...NOBODY, demo: true, demoSignIns: [TEO] });
    element.querySelector<HTMLButtonElement>('app-demo-sign-ins button')?.click();
    const request = http.expectOne({ method: 'POST', url: '/api/session' });
    expect(request.request.body).toEqual({ email: TEO.email, password: TEO.password });
  });

  it('goes back to where the visitor wanted to be', async () => {
    const { fixture, http } = await show(NOBODY, { return: '/t/charging/drops?state=new' });
    const navigate = jest.spyOn(TestBed.inject(Router), 'navigateByUrl').mockResolvedValue(true);
    await fillInAndSend(fixture, 'mira@quaywright.example', 'a long sentence');
    http.expectOne({ method: 'POST', url: '/api/session' }).flush({});
    http.expectOne('/api/session').flush(NOBODY);
    expect(navigate).toHaveBeenCalledWith('/t/charging/drops?state=new', { replaceUrl: true });
  });

  it.each(['//elsewhere.example', 'https://elsewhere.example', '/\\elsewhere.example'])(
    'does not follow %s out of the product',
    async (address) => {
      const { fixture, http } = await show(NOBODY, { return: address });
      const navigate = jest.spyOn(TestBed.inject(Router), 'navigateByUrl').mockResolvedValue(true);
      await fillInAndSend(fixture, 'mira@quaywright.example', 'a long sentence');
      http.expectOne({ method: 'POST', url: '/api/session' }).flush({});
      http.expectOne('/api/session').flush(NOBODY);
      expect(navigate).toHaveBeenCalledWith('/', { replaceUrl: true });
    },
  );

  it('keeps what was typed when the server refuses, and says what to do', async () => {
    const { fixture, http, element } = await show(NOBODY);
    await fillInAndSend(fixture, 'mira@quaywright.example', 'wrong');
    http.expectOne({ method: 'POST', url: '/api/session' }).flush(
      {
        type: '/problems/signedOut',
        title: 'Not signed in',
        status: 401,
        detail: 'E-mail and password do not fit together.',
        advice: 'Check both.',
      },
      { status: 401, statusText: 'Unauthorized' },
    );
    await fixture.whenStable();
    expect(element.querySelector('app-problem-banner')?.textContent).toContain('do not fit together');
    expect(element.querySelector<HTMLInputElement>('input[type=email]')?.value).toBe('mira@quaywright.example');
  });

  it('asks for missing fields without asking the server', async () => {
    const { fixture, http, element } = await show(NOBODY);
    await fillInAndSend(fixture, 'mira', '');
    http.expectNone({ method: 'POST', url: '/api/session' });
    expect([...element.querySelectorAll('mat-error')].map(({ textContent }) => textContent)).toEqual([
      'This is not an e-mail address.',
      'Please fill this in.',
    ]);
  });
});
