/** What the sender can give with a file that leaves it out. */
export const READING_NEEDS = ['frequencyUnit', 'levelUnit'] as const;
export type ReadingNeed = (typeof READING_NEEDS)[number];

export interface ReadingFault {
  /** Line of the file, from 1; null when the fault is not in one line. */
  readonly line: number | null;
  /** Column of the table, from 1; null when the fault is not in one column. */
  readonly column: number | null;
  readonly found: string;
  readonly expected: string;
  /** What to do about it, one sentence; empty when the fault says it all. */
  readonly advice: string;
  /** Set when nothing is wrong with the file but that this must be given with it. */
  readonly needs?: ReadingNeed;
}

const LONGEST_QUOTE = 60;

/** A file that cannot be read, with the place and what would have been right. */
export class ReadingError extends Error implements ReadingFault {
  readonly line: number | null;
  readonly column: number | null;
  readonly found: string;
  readonly expected: string;
  readonly advice: string;
  readonly needs?: ReadingNeed;

  constructor(fault: ReadingFault) {
    super(describe(fault));
    this.name = 'ReadingError';
    this.line = fault.line;
    this.column = fault.column;
    this.found = fault.found;
    this.expected = fault.expected;
    this.advice = fault.advice;
    this.needs = fault.needs;
  }
}

function describe({ line, column, found, expected, advice }: ReadingFault): string {
  const place = line === null ? '' : column === null ? `Line ${line}: ` : `Line ${line}, column ${column}: `;
  return `${place}found ${found}, expected ${expected}.${advice ? ` ${advice}` : ''}`;
}

/** Quotes text of a file for a message, cut to a readable length. */
export function quote(text: string): string {
  return text.length > LONGEST_QUOTE ? `"${text.slice(0, LONGEST_QUOTE)}..."` : `"${text}"`;
}
