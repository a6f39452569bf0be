import type { Detector, Line } from '../detectors/detectors';
import type { FrequencyUnit } from '../units/frequency-unit';
import { FREQUENCY_EXPONENT } from '../units/frequency-unit';
import type { LevelUnit } from '../units/level-unit';
import { LEVEL_OFFSET_TO_DBUV } from '../units/level-unit';
import { brokenRowError } from './broken-row';
import { checkFrequencies, checkLevels } from './checked-trace';
import { readHeadings } from './column-headings';
import type { DelimitedLayout } from './delimited-layout';
import { findDelimitedLayout } from './delimited-layout';
import { inferFrequencyUnit } from './infer-frequency-unit';
import { plainTextBytes } from './plain-text-bytes';
import type { PreambleLine, ReadingSettings } from './preamble';
import { preambleFacts, readPreamble } from './preamble';
import { ReadingError } from './reading-error';
import type { ScannedColumns } from './scan-columns';
import { scanColumns } from './scan-columns';
import type { LeftOutColumn } from './table-columns';
import { frequencyColumnOf, statedFrequencyUnit, traceColumnsOf } from './table-columns';
import { lineText } from './text-lines';

/** What the sender says of a file; what is left out the file has to say itself. */
export interface DelimitedOptions {
  readonly frequencyUnit?: FrequencyUnit;
  readonly levelUnit?: LevelUnit;
}

export interface ReadTrace {
  readonly name: string;
  /** Unit the levels were written in. */
  readonly levelUnit: LevelUnit;
  readonly detector?: Detector;
  readonly line?: Line;
  readonly levelsDbuv: Float32Array;
}

/** Something the reader concluded rather than read, for the person who imports to see. */
export interface Inference {
  readonly what: string;
  readonly value: string;
  readonly why: string;
}

export interface DelimitedReading {
  readonly frequenciesHz: Float64Array;
  readonly traces: readonly ReadTrace[];
  readonly frequencyUnit: FrequencyUnit;
  readonly delimiter: string;
  readonly decimalMark: '.' | ',';
  readonly preamble: readonly PreambleLine[];
  readonly settings: ReadingSettings;
  readonly inferred: readonly Inference[];
}

/**
 * Reads a sweep from delimited text: one column of frequencies and one or more of levels, under any heading and preamble.
 * Comma, semicolon or tab; decimal point or comma; UTF-8 or Latin-1; units from the heading, the preamble or the options.
 * Numbers are strict: a row that is not exactly one number a column stops the reading.
 * @param bytes the file
 * @param options units the sender gave; the file may leave them out but not contradict them
 * @returns frequencies in Hz, rising; traces in dBuV (50 ohm); what the file says of itself; what was inferred
 * @throws ReadingError naming line, column, what was found and what was expected
 * Source: our own definition.
 * Example: "f [MHz];QP [dBuV]" over "0,15;45,3" and more rows gives 150000 Hz, and one trace "QP" with 45.3 dBuV.
 */
export function readDelimited(bytes: Uint8Array, options: DelimitedOptions = {}): DelimitedReading {
  const text = plainTextBytes(bytes);
  const layout = findDelimitedLayout(text.bytes, text.start);
  const heading = readHeadings(layout);
  const preamble = readPreamble(heading.preamble, layout.delimiter);
  const facts = preambleFacts(preamble);
  const inferred: Inference[] = [];

  const frequencyColumn = frequencyColumnOf(heading);
  const frequencyUnit =
    statedFrequencyUnit(heading, frequencyColumn, facts, options.frequencyUnit) ??
    inferredUnit(text.bytes, layout, frequencyColumn, inferred);
  const { traces, leftOut } = traceColumnsOf(heading, layout.columnCount, frequencyColumn, facts, options.levelUnit);
  noteLeftOut(leftOut, inferred);

  const levelOffsetsDb = new Array<number>(layout.columnCount).fill(0);
  for (const { column, levelUnit } of traces) levelOffsetsDb[column] = LEVEL_OFFSET_TO_DBUV[levelUnit];
  const scanned = scanColumns(text.bytes, layout, {
    frequencyColumn,
    frequencyExponent: FREQUENCY_EXPONENT[frequencyUnit],
    levelOffsetsDb,
  });
  checkEnd(text.bytes, layout, scanned);
  checkFrequencies(scanned.frequenciesHz, layout.dataLine, frequencyColumn + 1);
  for (const { column } of traces) checkLevels(scanned.columns[column], layout.dataLine, column + 1);

  return {
    frequenciesHz: scanned.frequenciesHz,
    traces: traces.map(({ column, ...trace }) => ({ ...trace, levelsDbuv: scanned.columns[column] })),
    frequencyUnit,
    delimiter: layout.delimiter,
    decimalMark: layout.decimalMark,
    preamble,
    settings: facts.settings,
    inferred,
  };
}

/** Blank lines and the end-of-file mark of old systems may follow the table, nothing else. */
function checkEnd(bytes: Uint8Array, layout: DelimitedLayout, { brokenRow }: ScannedColumns): void {
  if (brokenRow === null) return;
  const restIsBlank = bytes.subarray(brokenRow.offset).every((byte) => byte <= 32);
  if (!restIsBlank) throw brokenRowError(bytes, brokenRow.offset, layout.dataLine + brokenRow.row, layout);
}

function inferredUnit(
  bytes: Uint8Array,
  layout: DelimitedLayout,
  frequencyColumn: number,
  inferred: Inference[],
): FrequencyUnit {
  const first = writtenFrequency(lineText(bytes, layout.dataOffset), layout, frequencyColumn);
  const last = writtenFrequency(lastLine(bytes), layout, frequencyColumn);
  if (Number.isNaN(first + last)) {
    // A first or last row that holds no number is reported as such, by the scan.
    const levelOffsetsDb = new Array<number>(layout.columnCount).fill(0);
    checkEnd(bytes, layout, scanColumns(bytes, layout, { frequencyColumn, frequencyExponent: 0, levelOffsetsDb }));
  }
  const unit = inferFrequencyUnit(first, last);
  if (unit === undefined) {
    throw new ReadingError({
      line: layout.dataLine,
      column: frequencyColumn + 1,
      found: `frequencies from ${first} to ${last} without a unit`,
      expected: 'Hz, kHz, MHz or GHz, in the file or given with it',
      advice: 'Choose the frequency unit for this file, or name it in the heading.',
      needs: 'frequencyUnit',
    });
  }
  inferred.push({
    what: 'frequency unit',
    value: unit,
    why: `the file names none, and only ${unit} puts ${first} to ${last} between 9 kHz and 1 GHz`,
  });
  return unit;
}

function writtenFrequency(line: string, { delimiter, decimalMark }: DelimitedLayout, column: number): number {
  const cell = line.split(delimiter).at(column) ?? '';
  return Number(decimalMark === ',' ? cell.replace(',', '.') : cell);
}

function lastLine(bytes: Uint8Array): string {
  let end = bytes.length;
  while (end > 0 && bytes[end - 1] <= 32) end--;
  return lineText(bytes, bytes.lastIndexOf(10, end - 1) + 1);
}

function noteLeftOut(leftOut: readonly LeftOutColumn[], inferred: Inference[]): void {
  for (const { column, why } of leftOut) inferred.push({ what: `column ${column + 1}`, value: 'left out', why });
}
