import { mailDocument } from './mail-document';

const OWN = { origin: 'http://127.0.0.1:3000', hostname: '127.0.0.1', port: '3000' };

it('sends links into the page that shows the mail, to this machine by its own name', () => {
  const mail = mailDocument('<p>See <a href="http://localhost:3000/t/charging/drops/4">the drop</a></p>', OWN);
  expect(mail).toContain(
    '<a href="http://127.0.0.1:3000/t/charging/drops/4" target="_top" rel="noreferrer">the drop</a>',
  );
});

it('takes out what would run, load or lead the frame elsewhere, and keeps the looks and pictures', () => {
  const mail = mailDocument(
    '<meta http-equiv="refresh" content="0;url=/"><base href="https://elsewhere.example"><script>alert(1)</script>' +
      '<iframe src="/"></iframe><p style="color:#123456">five lines</p><img src="data:image/png;base64,AA==">',
    OWN,
  );
  for (const gone of ['<meta', '<base', '<script', '<iframe']) expect(mail).not.toContain(gone);
  expect(mail).toContain('<p style="color:#123456">five lines</p><img src="data:image/png;base64,AA==">');
});
