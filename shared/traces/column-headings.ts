import type { DelimitedLayout } from './delimited-layout';
import { isNumberText } from './delimited-layout';
import type { TextLine } from './text-lines';
import { splitCells } from './text-lines';
import { isUnitOnly } from './unit-words';

/** What the heading says of one column. */
export interface ColumnHeading {
  readonly name: string;
  /** The cell that states the unit: the name itself, or the one below it in a row of units. */
  readonly unitText: string;
}

export interface TableHeading {
  /** One a column; empty when the table has no heading. */
  readonly columns: readonly ColumnHeading[];
  /** Line of the heading that states the units; null without one. */
  readonly line: number | null;
  /** The lines above that are no heading. */
  readonly preamble: readonly TextLine[];
}

const FREQUENCY_NAME = /^f$|fr[eé]q|^f\s*[[(/]|^[[(]?[kmg]?hz[\])]?$/i;
const SETTING_NAME = /rbw|vbw|bandwidth|detector|atten|start|stop|step|span|sweep|time|date|preamp|trace|unit|axis/i;

export function isFrequencyName(text: string): boolean {
  return FREQUENCY_NAME.test(text.trim());
}

/** Removes the sign with which many programs mark lines that are no data. */
export function withoutCommentMark(text: string): string {
  return text.replace(/^\s*(?:#+|!+|%+|\*+|\/\/+)\s*/, '');
}

/**
 * Reads the heading of a table: none, one row of names, or a row of names and one of units below it.
 * Two cells over a table of two columns may also be a setting and its value ("Detector;QP"): such a row is a heading only
 * when its first cell speaks of frequency.
 * @param layout the table and the lines above it
 * @returns headings and the lines that are left as preamble
 */
export function readHeadings(layout: DelimitedLayout): TableHeading {
  const lines = layout.linesAbove.filter(({ text }) => text.trim() !== '');
  const last = headingCells(lines.at(-1), layout);
  const above = headingCells(lines.at(-2), layout);
  if (last !== null && last.filter((cell) => cell !== '').every(isUnitOnly)) {
    const named = above !== null && isNameRow(above);
    return {
      columns: last.map((unitText, i) => ({ name: named ? above[i] : '', unitText })),
      line: lines.at(-1)?.number ?? null,
      preamble: lines.slice(0, named ? -2 : -1),
    };
  }
  if (last !== null && isNameRow(last)) {
    return {
      columns: last.map((name) => ({ name, unitText: name })),
      line: lines.at(-1)?.number ?? null,
      preamble: lines.slice(0, -1),
    };
  }
  return { columns: [], line: null, preamble: lines };
}

/** Cells of a line that has one cell a column and no number, else null. */
function headingCells(line: TextLine | undefined, layout: DelimitedLayout): string[] | null {
  if (line === undefined) return null;
  const cells = splitCells(withoutCommentMark(line.text), layout.delimiter);
  if (cells.length === layout.columnCount + 1 && cells.at(-1) === '') cells.pop();
  if (cells.length !== layout.columnCount) return null;
  return cells.some((cell) => isNumberText(cell, layout.decimalMark)) ? null : cells;
}

function isNameRow(cells: readonly string[]): boolean {
  if (SETTING_NAME.test(cells[0])) return false;
  return isFrequencyName(cells[0]) || (cells.length > 2 && cells.every((cell) => cell !== ''));
}
