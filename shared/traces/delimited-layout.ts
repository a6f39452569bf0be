import { quote, ReadingError } from './reading-error';
import type { ColumnLayout } from './scan-columns';
import type { TextLine } from './text-lines';
import { firstLines, splitCells } from './text-lines';

/** Where the table of a file is, and the lines above it. */
export interface DelimitedLayout extends ColumnLayout {
  /** Line of the first row of numbers, from 1. */
  readonly dataLine: number;
  readonly linesAbove: readonly TextLine[];
}

type DecimalMark = ColumnLayout['decimalMark'];

/** Semicolon and tab come first: where they stand, a comma may be a decimal mark. */
const FORMS: readonly (readonly [delimiter: string, decimalMark: DecimalMark])[] = [
  [';', '.'],
  [';', ','],
  ['\t', '.'],
  ['\t', ','],
  [',', '.'],
];
const NUMBER: Readonly<Record<DecimalMark, RegExp>> = {
  '.': /^[+-]?(?:\d+\.?\d*|\.\d+)(?:[eE][+-]?\d+)?$/,
  ',': /^[+-]?(?:\d+,?\d*|,\d+)(?:[eE][+-]?\d+)?$/,
};
/** The first cell of a row that was meant to hold numbers, even if it does not. */
const MEANT_AS_NUMBER = /^(?:[+-]?[.,]?\d.*|[+-]?nan|[+-]?inf(?:inity)?|null|n\/?a|[-*#?]*)$/i;
/** Mostly a few lines show the form; else a preamble of 60 lines, twice over, and rows behind it. */
const LINES_LOOKED_AT = [16, 160] as const;
const ROWS_THAT_SUFFICE = 8;

export function isNumberText(text: string, decimalMark: DecimalMark): boolean {
  return NUMBER[decimalMark].test(text);
}

interface FormCount {
  readonly delimiter: string;
  readonly decimalMark: DecimalMark;
  readonly columnCount: number;
  readonly rows: number;
}

/**
 * Finds the table in a file: delimiter, decimal mark, number of columns and first row.
 * Every form is tried on the first lines; the one that turns most of them into rows of two or more numbers is the file's.
 * @param bytes the file, ending with a line feed
 * @param start offset of the first line
 * @returns layout of the table and the lines above it
 * @throws ReadingError when no line is a row of two or more numbers
 */
export function findDelimitedLayout(bytes: Uint8Array, start: number): DelimitedLayout {
  let lines = firstLines(bytes, start, LINES_LOOKED_AT[0]);
  let form = commonestForm(lines);
  if (form === null || form.rows < ROWS_THAT_SUFFICE) {
    lines = firstLines(bytes, start, LINES_LOOKED_AT[1]);
    form = commonestForm(lines);
  }
  if (form === null) throw noTable(lines);
  const { delimiter, columnCount } = form;
  const first = firstDataLine(lines, form);
  const rowLine = lines.find((line) => numericCells(line, delimiter, form.decimalMark) === columnCount) ?? lines[first];
  return {
    delimiter,
    columnCount,
    decimalMark: delimiter === ',' ? '.' : (firstMark(bytes, lines[first].offset) ?? form.decimalMark),
    trailingDelimiter: splitCells(rowLine.text, delimiter).at(-1) === '',
    dataOffset: lines[first].offset,
    dataLine: lines[first].number,
    linesAbove: lines.slice(0, first),
  };
}

/** Number of cells when all are numbers and there are two at least, else 0; a delimiter at the end of the row is let pass. */
function numericCells(line: TextLine, delimiter: string, decimalMark: DecimalMark): number {
  if (!line.text.includes(delimiter)) return 0;
  const cells = line.text.split(delimiter);
  if (cells.length > 2 && cells.at(-1)?.trim() === '') cells.pop();
  return cells.length >= 2 && cells.every((cell) => isNumberText(cell.trim(), decimalMark)) ? cells.length : 0;
}

function commonestForm(lines: readonly TextLine[]): FormCount | null {
  let best: FormCount | null = null;
  for (const [delimiter, decimalMark] of FORMS) {
    const rowsOfCount = new Map<number, number>();
    for (const line of lines) {
      const columnCount = numericCells(line, delimiter, decimalMark);
      if (columnCount > 0) rowsOfCount.set(columnCount, (rowsOfCount.get(columnCount) ?? 0) + 1);
    }
    for (const [columnCount, rows] of rowsOfCount) {
      if (best === null || rows > best.rows) best = { delimiter, decimalMark, columnCount, rows };
    }
  }
  return best;
}

/**
 * Index of the first row of the table. A row right above the first sound one that was meant to hold numbers but does not
 * belongs to the table, so that it is reported and not taken for a heading.
 */
function firstDataLine(lines: readonly TextLine[], form: FormCount): number {
  let first = lines.findIndex((line) => numericCells(line, form.delimiter, form.decimalMark) === form.columnCount);
  while (first > 0 && isBrokenRow(lines[first - 1], form)) first--;
  return first;
}

function isBrokenRow({ text }: TextLine, { delimiter, decimalMark }: FormCount): boolean {
  const cells = splitCells(text, delimiter);
  if (isNumberText(cells[0], decimalMark)) return true;
  return MEANT_AS_NUMBER.test(cells[0]) && cells.slice(1).some((cell) => isNumberText(cell, decimalMark));
}

/** The first comma or point in the table, which must be its decimal mark. */
function firstMark(bytes: Uint8Array, offset: number): DecimalMark | undefined {
  const comma = bytes.indexOf(0x2c, offset);
  const point = bytes.indexOf(0x2e, offset);
  if (comma < 0 && point < 0) return undefined;
  return point < 0 || (comma >= 0 && comma < point) ? ',' : '.';
}

function noTable(lines: readonly TextLine[]): ReadingError {
  const suspect =
    lines.find(({ text }) => /^\s*[+-]?[.,]?\d/.test(text)) ??
    lines.findLast(({ text }) => text.trim() !== '') ??
    lines[0];
  return new ReadingError({
    line: suspect.number,
    column: null,
    found: quote(suspect.text),
    expected: 'a row of two or more numbers, frequency first, separated by comma, semicolon or tab',
    advice:
      lines.length === LINES_LOOKED_AT[1]
        ? `No such row is in the first ${lines.length} lines.`
        : 'The file holds no such row.',
  });
}
