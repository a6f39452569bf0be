import { ReadingError } from './reading-error';

const LINE_FEED = 10;
const CARRIAGE_RETURN = 13;
const BYTES_LOOKED_AT = 4096;

/** Bytes of a text file that end with a line feed, and where the text begins. */
export interface PlainText {
  readonly bytes: Uint8Array;
  /** 0, or 3 behind the mark some programs put before UTF-8. */
  readonly start: number;
}

/**
 * Makes sure that bytes are text and brings their line ends into one form.
 * @param given bytes of a file
 * @returns the bytes, copied only where a line end had to be changed or added
 * @throws ReadingError for an empty file, or one that is not text in UTF-8 or Latin-1
 */
export function plainTextBytes(given: Uint8Array): PlainText {
  if (given.every((byte) => byte <= 32)) {
    throw new ReadingError({
      line: null,
      column: null,
      found: given.length === 0 ? 'an empty file' : 'a file of blank lines only',
      expected: 'rows of frequency and level',
      advice: 'Export the sweep again.',
    });
  }
  for (let i = 0; i < given.length && i < BYTES_LOOKED_AT; i++) {
    const byte = given[i];
    // Tab, line feed, form feed, carriage return and the end-of-file mark of old systems are all that text needs.
    if (byte >= 32 || (byte >= 9 && byte <= 13) || byte === 26) continue;
    throw new ReadingError({
      line: null,
      column: null,
      found: `a binary file (byte ${byte})`,
      expected: 'plain text in UTF-8 or Latin-1',
      advice: 'Export the sweep as text (CSV); save a spreadsheet as CSV, and UTF-16 text as UTF-8.',
    });
  }
  const start = given[0] === 0xef && given[1] === 0xbb && given[2] === 0xbf ? 3 : 0;
  if (given[given.length - 1] === LINE_FEED) return { bytes: given, start };
  const bytes = new Uint8Array(given.length + 1);
  bytes.set(given);
  bytes[given.length] = LINE_FEED;
  if (given.indexOf(LINE_FEED) < 0) {
    for (let i = bytes.indexOf(CARRIAGE_RETURN); i >= 0; i = bytes.indexOf(CARRIAGE_RETURN, i)) bytes[i] = LINE_FEED;
  }
  return { bytes, start };
}
