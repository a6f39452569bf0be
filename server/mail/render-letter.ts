/** A short mail with at most one link to follow. */
export interface Letter {
  heading: string;
  paragraphs: readonly string[];
  link?: { label: string; url: string };
  /** Why the reader gets it. */
  footer: string;
}

const BODY = 'margin:0;padding:24px;background:#f1f5f6;font-family:Noto Sans,Segoe UI,Helvetica,Arial,sans-serif';
const CARD =
  'max-width:560px;margin:0 auto;padding:24px;background:#ffffff;color:#14212a;font-size:15px;line-height:23px';
const LINK = 'display:inline-block;padding:10px 18px;background:#00696d;color:#ffffff;text-decoration:none';
const SMALL = 'color:#4c5c65;font-size:13px;line-height:19px';

/** The same letter as text and as HTML, every given text escaped. */
export function renderLetter({ heading, paragraphs, link, footer }: Letter): { text: string; html: string } {
  const text = [heading, ...paragraphs, ...(link ? [`${link.label}:\n${link.url}`] : []), `-- \n${footer}`];
  const html = [
    `<h1 style="margin:0 0 16px;font-size:20px;line-height:28px">${escapeHtml(heading)}</h1>`,
    ...paragraphs.map((paragraph) => `<p>${escapeHtml(paragraph)}</p>`),
    ...(link ? [linkHtml(link)] : []),
    `<p style="${SMALL}">${escapeHtml(footer)}</p>`,
  ];
  return {
    text: `${text.join('\n\n')}\n`,
    html: `<!doctype html><html lang="en"><body style="${BODY}"><div style="${CARD}">${html.join('')}</div></body></html>`,
  };
}

function linkHtml({ label, url }: { label: string; url: string }): string {
  const address = escapeHtml(url);
  return (
    `<p><a href="${address}" style="${LINK}">${escapeHtml(label)}</a></p>` +
    `<p style="${SMALL}">If the button does not work, open this address: ${address}</p>`
  );
}

const ENTITIES: Record<string, string> = { '&': '&amp;', '<': '&lt;', '>': '&gt;', '"': '&quot;', "'": '&#39;' };

/** Text as it must stand in HTML, between tags or inside quoted attributes. */
export function escapeHtml(text: string): string {
  return text.replace(/[&<>"']/g, (character) => ENTITIES[character] ?? character);
}
