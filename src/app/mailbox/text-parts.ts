import { onOwnOrigin } from './own-origin';

/** A stretch of a mail's text; with an address it is a link. */
export interface TextPart {
  text: string;
  address?: string;
}

/** An address runs to the next space; a mark at its end belongs to the sentence around it. */
const ADDRESS = /https?:\/\/[^\s<>"]*[^\s<>".,;:!?)\]]/g;

/** Cuts plain text at its web addresses. */
export function textParts(text: string, own: Pick<Location, 'origin' | 'hostname' | 'port'>): TextPart[] {
  const parts: TextPart[] = [];
  let end = 0;
  for (const match of text.matchAll(ADDRESS)) {
    if (match.index > end) parts.push({ text: text.slice(end, match.index) });
    parts.push({ text: match[0], address: onOwnOrigin(match[0], own) });
    end = match.index + match[0].length;
  }
  if (end < text.length) parts.push({ text: text.slice(end) });
  return parts;
}
