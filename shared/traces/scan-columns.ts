/** Where the numbers of a file begin and what separates them. */
export interface ColumnLayout {
  readonly delimiter: string;
  readonly decimalMark: '.' | ',';
  readonly columnCount: number;
  /** Whether every row ends with a delimiter. */
  readonly trailingDelimiter: boolean;
  /** Offset of the first row of numbers. */
  readonly dataOffset: number;
}

/** What a scan has to do with the columns. */
export interface ColumnUse {
  readonly frequencyColumn: number;
  /** Power of ten from the frequency unit to Hz. */
  readonly frequencyExponent: number;
  /** Added to the levels of each column, in dB; the entry of the frequency column is not used. */
  readonly levelOffsetsDb: readonly number[];
}

export interface ScannedColumns {
  readonly frequenciesHz: Float64Array;
  /** Levels of every column; the entry of the frequency column is empty. */
  readonly columns: Float32Array[];
  /** Offset and row, from 0, of the first row that does not keep the layout; null when all do. */
  readonly brokenRow: { readonly offset: number; readonly row: number } | null;
}

const LINE_FEED = 10;
const CARRIAGE_RETURN = 13;
const SPACE = 32;
const PLUS = 43;
const MINUS = 45;
const DIGIT_ZERO = 48;
const LOWER_CASE_BIT = 32;
const LETTER_E = 101;
/** Digits that fit a 32-bit integer for certain, and those that fit the 53 bits of a double. */
const INT32_DIGITS = 9;
const EXACT_DIGITS = 15;
/** Powers of ten that are exact doubles. */
const POWERS = Float64Array.from({ length: 23 }, (_, power) => Number(`1e${power}`));

/**
 * Reads rows of numbers from bytes into typed arrays, without making a string of them.
 * Formula: number = digits * 10^(exponent - decimals); with at most 15 digits and a power within +-22 both factors are exact
 * doubles and one multiplication or division rounds correctly, so the result is Number()'s own. Longer numbers go to Number().
 * The unit of frequency is part of the power: 0.15 MHz is 15 * 10^4, exactly 150000.
 * @param bytes the file, ending with a line feed (the scan never reads past the end)
 * @param layout delimiter, decimal mark, columns and first row
 * @param use which column holds frequencies, its power of ten, and what to add to the levels
 * @returns columns of all rows up to the first that breaks the layout
 * Source: fast path of decimal conversion, W. D. Clinger, "How to read floating point numbers accurately", 1990 (from memory).
 * Example: "0.15;45,3" with ';' and ',' and the MHz power 6 gives 150000 Hz and 45.3 dB.
 */
export function scanColumns(bytes: Uint8Array, layout: ColumnLayout, use: ColumnUse): ScannedColumns {
  const { columnCount, trailingDelimiter } = layout;
  const { frequencyColumn, frequencyExponent } = use;
  const delimiter = layout.delimiter.charCodeAt(0);
  const decimalMark = layout.decimalMark.charCodeAt(0);
  const end = bytes.length;
  const lastColumn = columnCount - 1;
  const offsetsDb = Float64Array.from(use.levelOffsetsDb);

  let position = layout.dataOffset;
  let capacity = Math.ceil((end - position) / (bytes.indexOf(LINE_FEED, position) + 1 - position)) + 16;
  let frequenciesHz = new Float64Array(capacity);
  const columns = Array.from({ length: columnCount }, (_, i) => new Float32Array(i === frequencyColumn ? 0 : capacity));
  let row = 0;
  let brokenOffset = -1;

  rows: while (position < end) {
    const rowOffset = position;
    if (row === capacity) {
      capacity *= 2;
      frequenciesHz = grown(frequenciesHz, new Float64Array(capacity));
      for (let i = 0; i < columnCount; i++) {
        if (i !== frequencyColumn) columns[i] = grown(columns[i], new Float32Array(capacity));
      }
    }
    for (let column = 0; column < columnCount; column++) {
      let byte = bytes[position];
      let negative = false;
      if (byte < DIGIT_ZERO) {
        while (byte === SPACE) byte = bytes[++position];
        negative = byte === MINUS;
        if (negative || byte === PLUS) byte = bytes[++position];
      }

      const digitsOffset = position;
      // Overflows beyond 9 digits; such a mantissa is read again below.
      let mantissa = 0;
      let digit = byte ^ DIGIT_ZERO;
      while (digit < 10) {
        mantissa = (Math.imul(mantissa, 10) + digit) | 0;
        byte = bytes[++position];
        digit = byte ^ DIGIT_ZERO;
      }
      let digitCount = position - digitsOffset;
      let power = 0;
      if (byte === decimalMark) {
        const decimalsOffset = ++position;
        byte = bytes[position];
        digit = byte ^ DIGIT_ZERO;
        while (digit < 10) {
          mantissa = (Math.imul(mantissa, 10) + digit) | 0;
          byte = bytes[++position];
          digit = byte ^ DIGIT_ZERO;
        }
        power = decimalsOffset - position;
        digitCount -= power;
      }
      if (digitCount === 0) {
        brokenOffset = rowOffset;
        break rows;
      }
      const digitsEnd = position;
      if ((byte | LOWER_CASE_BIT) === LETTER_E) {
        byte = bytes[++position];
        const negativeExponent = byte === MINUS;
        if (negativeExponent || byte === PLUS) byte = bytes[++position];
        const exponentOffset = position;
        let exponent = 0;
        digit = byte ^ DIGIT_ZERO;
        while (digit < 10) {
          if (exponent < 10_000) exponent = exponent * 10 + digit;
          byte = bytes[++position];
          digit = byte ^ DIGIT_ZERO;
        }
        if (position === exponentOffset) {
          brokenOffset = rowOffset;
          break rows;
        }
        power += negativeExponent ? -exponent : exponent;
      }
      if (column === frequencyColumn) power += frequencyExponent;

      let number: number;
      if (digitCount <= EXACT_DIGITS && power >= -22 && power <= 22) {
        number = digitCount <= INT32_DIGITS ? mantissa : longMantissa(bytes, digitsOffset, digitsEnd);
        if (power < 0) number /= POWERS[-power];
        else if (power > 0) number *= POWERS[power];
      } else number = slowNumber(bytes, digitsOffset, digitsEnd, power);
      if (negative) number = -number;
      if (column === frequencyColumn) frequenciesHz[row] = number;
      else columns[column][row] = number + offsetsDb[column];

      while (byte === SPACE) byte = bytes[++position];
      if (column < lastColumn) {
        if (byte !== delimiter) {
          brokenOffset = rowOffset;
          break rows;
        }
        position++;
        continue;
      }
      if (trailingDelimiter) {
        if (byte !== delimiter) {
          brokenOffset = rowOffset;
          break rows;
        }
        do byte = bytes[++position];
        while (byte === SPACE);
      }
      if (byte === CARRIAGE_RETURN) byte = bytes[++position];
      if (byte !== LINE_FEED) {
        brokenOffset = rowOffset;
        break rows;
      }
      position++;
    }
    row++;
  }
  return {
    frequenciesHz: cutOff(frequenciesHz, row),
    columns: columns.map((column) => cutOff(column, row)),
    brokenRow: brokenOffset < 0 ? null : { offset: brokenOffset, row },
  };
}

function grown<T extends Float64Array | Float32Array>(from: T, into: T): T {
  into.set(from);
  return into;
}

/** The first numbers of a column; copied only where what lies behind them would keep much memory for nothing. */
function cutOff<T extends Float64Array | Float32Array>(column: T, rows: number): T {
  return (2 * rows > column.length ? column.subarray(0, rows) : column.slice(0, rows)) as T;
}

/** Digits as one number, whatever mark stands between them; exact up to 15 digits. */
function longMantissa(bytes: Uint8Array, start: number, end: number): number {
  let mantissa = 0;
  for (let i = start; i < end; i++) {
    const digit = bytes[i] ^ DIGIT_ZERO;
    if (digit < 10) mantissa = mantissa * 10 + digit;
  }
  return mantissa;
}

/** Longer than any instrument writes; beyond it only somebody's attempt to keep the reader busy. */
const MOST_DIGITS = 64;

/** The same for any number of digits and any power, by way of Number(); Infinity, which no file may hold, beyond 64. */
function slowNumber(bytes: Uint8Array, start: number, end: number, power: number): number {
  if (end - start > MOST_DIGITS) return Infinity;
  let digits = '';
  for (let i = start; i < end; i++) if ((bytes[i] ^ DIGIT_ZERO) < 10) digits += String.fromCharCode(bytes[i]);
  return Number(`${digits}e${power}`);
}
