import { provideHttpClient } from '@angular/common/http';
import { HttpTestingController, provideHttpClientTesting } from '@angular/common/http/testing';
import { TestBed } from '@angular/core/testing';
import { MatIconTestingModule } from '@angular/material/icon/testing';
import type { TokenCreated } from '@shared/contracts/teams';
import { TokenForm } from './token-form';

async function show() {
  TestBed.configureTestingModule({
    imports: [MatIconTestingModule],
    providers: [provideHttpClient(), provideHttpClientTesting()],
  });
  const fixture = TestBed.createComponent(TokenForm);
  fixture.componentRef.setInput('team', 'charging');
  const created: TokenCreated[] = [];
  fixture.componentInstance.created.subscribe((token) => created.push(token));
  await fixture.whenStable();
  const element = fixture.nativeElement as HTMLElement;
  const name = element.querySelector<HTMLInputElement>('input[formControlName=name]') as HTMLInputElement;
  name.value = 'bench-2';
  name.dispatchEvent(new Event('input'));
  const send = async () => {
    element.querySelector('form')?.dispatchEvent(new Event('submit'));
    await fixture.whenStable();
  };
  return { fixture, element, created, send, http: TestBed.inject(HttpTestingController) };
}

const TOKENS = { method: 'POST', url: '/api/teams/charging/tokens' };

it('makes no token without a scope and says so', async () => {
  const { element, http, send } = await show();
  await send();
  http.expectNone(TOKENS);
  expect(element.textContent).toContain('Choose at least one.');
});

it('asks for the scopes that are ticked and hands the token on', async () => {
  const { fixture, element, http, send, created } = await show();
  const [write, , gate] = element.querySelectorAll<HTMLInputElement>('mat-checkbox input');
  write.click();
  gate.click();
  await fixture.whenStable();
  await send();
  const request = http.expectOne(TOKENS);
  expect(request.request.body).toEqual({ name: 'bench-2', scopes: ['sweeps:write', 'gate:read'] });
  request.flush({ id: 1, name: 'bench-2', token: 'strand_1_secret' });
  expect(created.map(({ token }) => token)).toEqual(['strand_1_secret']);
});
