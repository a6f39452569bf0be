import { onOwnOrigin } from './own-origin';

/**
 * The HTML of a mail for a frame of its own: links lead out of the frame into the page's window, to this machine by the
 * name it is read under. Nothing in it can run: the frame is sandboxed, and what would load or reload is taken out.
 */
export function mailDocument(html: string, own: Pick<Location, 'origin' | 'hostname' | 'port'>): string {
  const mail = new DOMParser().parseFromString(html, 'text/html');
  mail.querySelectorAll('script, meta[http-equiv], base, iframe, object, embed').forEach((element) => element.remove());
  for (const link of mail.querySelectorAll('a[href]')) {
    link.setAttribute('href', onOwnOrigin(link.getAttribute('href') ?? '', own));
    link.setAttribute('target', '_top');
    link.setAttribute('rel', 'noreferrer');
  }
  return `<!doctype html>${mail.documentElement.outerHTML}`;
}
