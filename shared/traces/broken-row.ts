import { isNumberText } from './delimited-layout';
import { quote, ReadingError } from './reading-error';
import type { ColumnLayout } from './scan-columns';
import { lineText } from './text-lines';

/** Says what is wrong with a row that does not keep the layout of the table. */
export function brokenRowError(bytes: Uint8Array, offset: number, line: number, layout: ColumnLayout): ReadingError {
  const { columnCount, delimiter, decimalMark, trailingDelimiter } = layout;
  const text = lineText(bytes, offset);
  const cells = text.split(delimiter).map((cell) => cell.trim());
  if (trailingDelimiter && cells.length === columnCount + 1 && cells.at(-1) === '') cells.pop();
  const bad = cells.slice(0, columnCount).findIndex((cell) => !isNumberText(cell, decimalMark));
  if (cells.length > 1 && bad >= 0) {
    return new ReadingError({
      line,
      column: bad + 1,
      found: cells[bad] === '' ? 'an empty cell' : quote(cells[bad]),
      expected: `a number with decimal ${decimalMark === '.' ? 'point' : 'comma'}`,
      advice: adviceForCell(cells[bad]),
    });
  }
  if (text.trim() === '') {
    return new ReadingError({
      line,
      column: null,
      found: 'a blank line within the table',
      expected: `a row of ${columnCount} numbers`,
      advice: 'One file holds one table; split files that hold several.',
    });
  }
  const lacking = cells.length < columnCount;
  return new ReadingError({
    line,
    column: lacking ? cells.length + 1 : columnCount + 1,
    found: cells.length === 1 ? quote(text) : `${cells.length} columns`,
    expected: `${columnCount} columns as in the rows above`,
    advice: lacking ? 'The row is incomplete; export the sweep again.' : 'Check the delimiter of this row.',
  });
}

function adviceForCell(cell: string): string {
  if (cell === '' || /^(?:[+-]?nan|null|n\/?a|-+)$/i.test(cell))
    return 'Leave points without a reading out of the file.';
  if (/^".*"$/.test(cell)) return 'Write numbers without quotes.';
  if (/^[+-]?\d/.test(cell) && /[a-z]/i.test(cell)) return 'Write the unit once, in the heading.';
  return '';
}
