import type { FrequencyRaster } from '@shared/simulation/emission-spectrum';

// NOTE: taken once: looking Math up in every turn of these loops is ten times slower in a test runner's sandbox.
const { abs, round } = Math;

/** How a simulated instrument writes its file. */
export interface FileLayout {
  delimiter: ',' | ';';
  decimalMark: '.' | ',';
}

/** One level column with its heading. */
export interface LevelColumn {
  heading: string;
  levelsDbuv: Float32Array;
}

/** Widest cell written: a delimiter, a sign, four digits, a mark and two decimals, or a frequency with one decimal. */
const CELL_BYTES = 12;
const ZERO = 48;
const MINUS = 45;
const LINE_FEED = 10;

/**
 * Writes a sweep file: preamble lines, one heading line, then frequency in Hz and levels in dBuV to 0.01 dB.
 *
 * Bytes are written straight into one array, because a demo of some hundred files of 6,634 rows is made at the first start.
 *
 * @param preamble key and text of the lines above the table; texts must not hold the delimiter
 * @param raster tuned frequencies; start and step in Hz, multiples of 1 Hz
 * @param columns levels, each as long as the raster
 * @param layout delimiter and decimal mark, not the same sign
 * @returns the file's bytes, ASCII
 */
export function fileText(
  preamble: [key: string, text: string][],
  raster: FrequencyRaster,
  columns: LevelColumn[],
  layout: FileLayout = { delimiter: ',', decimalMark: '.' },
): Uint8Array {
  const heading = ['Frequency (Hz)', ...columns.map((column) => column.heading)].join(layout.delimiter);
  const lines = preamble.map(([key, text]) => `${key}${layout.delimiter}${text}`);
  const head = new TextEncoder().encode([...lines, heading, ''].join('\n'));
  const bytes = new Uint8Array(head.length + raster.pointCount * (columns.length + 1) * CELL_BYTES);
  bytes.set(head);
  const delimiter = layout.delimiter.charCodeAt(0);
  const decimalMark = layout.decimalMark.charCodeAt(0);
  let end = head.length;
  for (let point = 0; point < raster.pointCount; point++) {
    end = writeInteger(bytes, end, raster.startHz + point * raster.stepHz);
    for (const { levelsDbuv } of columns) {
      bytes[end++] = delimiter;
      end = writeHundredths(bytes, end, round(levelsDbuv[point] * 100), decimalMark);
    }
    bytes[end++] = LINE_FEED;
  }
  return bytes.slice(0, end);
}

function writeInteger(bytes: Uint8Array, start: number, count: number): number {
  let digits = 1;
  for (let power = 10; power <= count; power *= 10) digits++;
  let rest = count;
  for (let position = start + digits - 1; position >= start; position--) {
    const shorter = (rest / 10) | 0;
    bytes[position] = ZERO + rest - shorter * 10;
    rest = shorter;
  }
  return start + digits;
}

function writeHundredths(bytes: Uint8Array, start: number, hundredths: number, decimalMark: number): number {
  let end = start;
  if (hundredths < 0) bytes[end++] = MINUS;
  const size = abs(hundredths);
  const whole = (size / 100) | 0;
  const part = size - whole * 100;
  end = writeInteger(bytes, end, whole);
  bytes[end++] = decimalMark;
  bytes[end++] = ZERO + ((part / 10) | 0);
  bytes[end++] = ZERO + (part % 10);
  return end;
}
