/** One line of a text file, without its line end. */
export interface TextLine {
  /** From 1, as an editor counts. */
  readonly number: number;
  /** Offset of its first byte. */
  readonly offset: number;
  readonly text: string;
}

const LINE_FEED = 10;
const CARRIAGE_RETURN = 13;

/** A longer line is cut: it is no row of a sweep, and a message quotes far less. */
const LONGEST_LINE = 8192;

/**
 * Decodes a stretch of bytes as UTF-8, or as Latin-1 where it is not valid UTF-8: older instruments write the micro sign so.
 * Meant for single lines; a whole sweep is never turned into text.
 */
export function decodeText(bytes: Uint8Array, start: number, end: number): string {
  const part = bytes.subarray(start, Math.min(end, start + LONGEST_LINE));
  const text = String.fromCharCode(...part);
  if (part.every((byte) => byte < 128)) return text;
  try {
    return decodeURIComponent(Array.from(part, (byte) => `%${byte.toString(16).padStart(2, '0')}`).join(''));
  } catch {
    return text;
  }
}

/** Offset of the end of the line that begins at `offset`: of its line feed, or of the end of the bytes. */
export function lineEnd(bytes: Uint8Array, offset: number): number {
  const end = bytes.indexOf(LINE_FEED, offset);
  return end < 0 ? bytes.length : end;
}

/** Decodes the line that begins at `offset`. */
export function lineText(bytes: Uint8Array, offset: number): string {
  const end = lineEnd(bytes, offset);
  return decodeText(bytes, offset, end > offset && bytes[end - 1] === CARRIAGE_RETURN ? end - 1 : end);
}

/** The first lines of a file, from `offset` on, `most` at most. */
export function firstLines(bytes: Uint8Array, offset: number, most: number): TextLine[] {
  const lines: TextLine[] = [];
  for (let start = offset; start < bytes.length && lines.length < most; start = lineEnd(bytes, start) + 1) {
    lines.push({ number: lines.length + 1, offset: start, text: lineText(bytes, start) });
  }
  return lines;
}

/** Cuts a line of text into trimmed cells; a delimiter within double quotes does not cut. */
export function splitCells(text: string, delimiter: string): string[] {
  const cells: string[] = [];
  let cell = '';
  let quoted = false;
  for (const character of text) {
    if (character === '"') quoted = !quoted;
    else if (character === delimiter && !quoted) {
      cells.push(cell.trim());
      cell = '';
    } else cell += character;
  }
  cells.push(cell.trim());
  return cells;
}
