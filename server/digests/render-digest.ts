import { formatDecibels } from '@shared/units/format-decibels';
import { escapeHtml } from '../mail/render-letter';
import type { DigestFacts } from './digest-facts';
import { type DigestSection, digestSections } from './digest-sections';
import { fiveLines } from './five-lines';

/** Stands for the recipient's own unsubscribe address, which is put in when the mail is written. */
export const UNSUBSCRIBE_PLACE = '{{unsubscribe}}';

export interface RenderedDigest {
  subject: string;
  text: string;
  html: string;
}

const BODY = 'margin:0;padding:24px;background:#f1f5f6;font-family:Noto Sans,Segoe UI,Helvetica,Arial,sans-serif';
const CARD =
  'max-width:680px;margin:0 auto;padding:24px;background:#ffffff;color:#14212a;font-size:15px;line-height:23px';
const SMALL = 'color:#4c5c65;font-size:13px;line-height:19px';
const LINK = 'color:#00696d';
const CAUTION =
  'Pre-compliance results. They indicate; only an accredited test shows. Check the limits against your edition of the standard.';

/**
 * The digest in text and HTML, five lines first.
 *
 * @param publicUrl start of every link
 * @param pictures content id of the trend picture by product key
 */
export function renderDigest(
  facts: DigestFacts,
  publicUrl: string,
  pictures: ReadonlyMap<string, string>,
): RenderedDigest {
  const lines = fiveLines(facts);
  const sections = digestSections(facts);
  return {
    subject: subjectOf(facts),
    text: asText(facts, lines, sections, publicUrl),
    html: asHtml(facts, lines, sections, publicUrl, pictures),
  };
}

function subjectOf({ teamName, drops: { newOnes }, products }: DigestFacts): string {
  const over = products.filter(({ latestBuild }) => (latestBuild?.worstMarginDb ?? 0) < 0).length;
  const dropped =
    newOnes.length === 0 ? 'nothing dropped' : `${newOnes.length} new drop${newOnes.length === 1 ? '' : 's'}`;
  return `${teamName}: ${dropped}${over > 0 ? `, ${over} over the limit` : ''}`;
}

function asText(
  facts: DigestFacts,
  lines: readonly string[],
  sections: readonly DigestSection[],
  publicUrl: string,
): string {
  const blocks = [
    lines.join('\n'),
    ...sections.map(({ heading, items, none }) => {
      const rows = items.map(({ text, path }) => `- ${text}${path === undefined ? '' : `\n  ${publicUrl}${path}`}`);
      return `${heading.toUpperCase()}\n${rows.length === 0 ? none : rows.join('\n')}`;
    }),
    `All products: ${publicUrl}/t/${facts.teamKey}/overview`,
    `-- \n${CAUTION}\nYou get this because the team ${facts.teamName} sends it to you every week.\nNo longer: ${UNSUBSCRIBE_PLACE}`,
  ];
  return `${blocks.join('\n\n')}\n`;
}

function asHtml(
  facts: DigestFacts,
  lines: readonly string[],
  sections: readonly DigestSection[],
  publicUrl: string,
  pictures: ReadonlyMap<string, string>,
): string {
  const parts = [
    `<h1 style="margin:0 0 12px;font-size:20px;line-height:28px">${escapeHtml(subjectOf(facts))}</h1>`,
    `<p style="margin:0 0 20px">${lines.map(escapeHtml).join('<br>')}</p>`,
    ...sections.map((section) => sectionHtml(section, publicUrl)),
    `<h2 style="font-size:16px;margin:24px 0 8px">Worst margin, build by build</h2>`,
    ...facts.products.map((product) => pictureHtml(product, facts.teamKey, publicUrl, pictures.get(product.key))),
    `<p style="${SMALL}">${escapeHtml(CAUTION)}</p>`,
    `<p style="${SMALL}">You get this because the team ${escapeHtml(facts.teamName)} sends it to you every week. <a style="${LINK}" href="${UNSUBSCRIBE_PLACE}">No longer</a></p>`,
  ];
  return `<!doctype html><html lang="en"><body style="${BODY}"><div style="${CARD}">${parts.join('')}</div></body></html>`;
}

function sectionHtml({ heading, items, none }: DigestSection, publicUrl: string): string {
  const rows = items.map(({ text, path }) => {
    const more = path === undefined ? '' : ` <a style="${LINK}" href="${escapeHtml(publicUrl + path)}">Open</a>`;
    return `<li style="margin:0 0 6px">${escapeHtml(text)}${more}</li>`;
  });
  const body =
    rows.length === 0
      ? `<p style="margin:0;${SMALL}">${escapeHtml(none)}</p>`
      : `<ul style="margin:0;padding-left:20px">${rows.join('')}</ul>`;
  return `<h2 style="font-size:16px;margin:20px 0 6px">${escapeHtml(heading)}</h2>${body}`;
}

function pictureHtml(
  { key, name, latestBuild }: DigestFacts['products'][number],
  teamKey: string,
  publicUrl: string,
  contentId: string | undefined,
): string {
  const now = latestBuild?.worstMarginDb == null ? 'not measured' : `${formatDecibels(latestBuild.worstMarginDb)} now`;
  const title = `<a style="${LINK}" href="${escapeHtml(`${publicUrl}/t/${teamKey}/products/${key}`)}">${escapeHtml(name)}</a>, ${escapeHtml(now)}`;
  const picture =
    contentId === undefined
      ? ''
      : `<br><img src="cid:${escapeHtml(contentId)}" width="600" alt="Trend of the worst margin of ${escapeHtml(name)}">`;
  return `<p style="margin:0 0 16px">${title}${picture}</p>`;
}
