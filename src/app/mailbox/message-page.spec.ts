import { provideHttpClient } from '@angular/common/http';
import { HttpTestingController, provideHttpClientTesting } from '@angular/common/http/testing';
import { TestBed } from '@angular/core/testing';
import { MatIconTestingModule } from '@angular/material/icon/testing';
import type { MailboxMessage } from '@shared/contracts/digests';
import { MessagePage } from './message-page';

const MESSAGE: MailboxMessage = {
  id: 2,
  receivedAt: '2026-12-01T15:25:00.000Z',
  from: 'Strandline <strandline@localhost>',
  to: 'mira@quaywright.example',
  subject: 'Charging: nothing dropped',
  text: 'All products: http://localhost/t/charging/overview',
  html: '<h1>Charging</h1><script>parent.alert(1)</script><img src="data:image/png;base64,AA==">',
  headers: [{ name: 'List-Unsubscribe-Post', value: 'List-Unsubscribe=One-Click' }],
  attachments: [
    { fileName: 'psu.png', contentType: 'image/png', byteLength: 1, dataUrl: 'data:image/png;base64,AA==' },
  ],
};

async function show(message: MailboxMessage) {
  TestBed.configureTestingModule({
    imports: [MatIconTestingModule],
    providers: [provideHttpClient(), provideHttpClientTesting()],
  });
  const fixture = TestBed.createComponent(MessagePage);
  fixture.componentRef.setInput('id', '2');
  TestBed.tick();
  TestBed.inject(HttpTestingController).expectOne('/api/mailbox/2').flush(message);
  await fixture.whenStable();
  return fixture.nativeElement as HTMLElement;
}

it('shows HTML in a frame that can neither run scripts nor reach this page', async () => {
  const frame = (await show(MESSAGE)).querySelector('iframe');
  const allowed = frame?.getAttribute('sandbox')?.split(' ');
  expect(allowed).toEqual(['allow-top-navigation-by-user-activation']);
  expect(frame?.srcdoc).toContain('<h1>Charging</h1>');
  expect(frame?.srcdoc).not.toContain('<script');
});

it('shows a message without HTML as text, its addresses as links', async () => {
  const element = await show({ ...MESSAGE, html: null });
  expect(element.querySelector('iframe')).toBeNull();
  expect(element.querySelector('.text a')?.getAttribute('href')).toBe('http://localhost/t/charging/overview');
});

it('offers what is attached as a download under its name', async () => {
  const link = (await show(MESSAGE)).querySelector<HTMLAnchorElement>('a[download]');
  expect([link?.download, link?.getAttribute('href')]).toEqual(['psu.png', 'data:image/png;base64,AA==']);
});
