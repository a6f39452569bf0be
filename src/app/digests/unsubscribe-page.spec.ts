import { provideHttpClient } from '@angular/common/http';
import { HttpTestingController, provideHttpClientTesting } from '@angular/common/http/testing';
import { TestBed } from '@angular/core/testing';
import { MatIconTestingModule } from '@angular/material/icon/testing';
import { provideRouter } from '@angular/router';
import { UnsubscribePage } from './unsubscribe-page';

async function show() {
  TestBed.configureTestingModule({
    imports: [MatIconTestingModule],
    providers: [provideHttpClient(), provideHttpClientTesting(), provideRouter([])],
  });
  const fixture = TestBed.createComponent(UnsubscribePage);
  fixture.componentRef.setInput('secret', 'a_b-c');
  await fixture.whenStable();
  const element = fixture.nativeElement as HTMLElement;
  return { fixture, element, http: TestBed.inject(HttpTestingController), button: element.querySelector('button') };
}

it('stops nothing when it is only opened, as mail programs do ahead', async () => {
  const { http, element } = await show();
  http.verify();
  expect(element.textContent).toContain('Do you want to stop the weekly digest');
});

it('stops the digest on a click and says so', async () => {
  const { fixture, http, element, button } = await show();
  button?.click();
  http.expectOne({ method: 'POST', url: '/api/digest/unsubscribe/a_b-c' }).flush({ isUnsubscribed: true });
  await fixture.whenStable();
  expect(element.querySelector('[role=status]')?.textContent).toContain('gets no more digests');
});

it('lets one try again when the server did not answer', async () => {
  const { fixture, http, element, button } = await show();
  button?.click();
  http.expectOne('/api/digest/unsubscribe/a_b-c').error(new ProgressEvent('offline'));
  await fixture.whenStable();
  expect(element.textContent).toContain('You are still subscribed.');
  expect(button?.disabled).toBe(false);
});
