import fc from 'fast-check';
import type { ColumnLayout } from './scan-columns';
import { scanColumns } from './scan-columns';

const layout: ColumnLayout = {
  delimiter: ',',
  decimalMark: '.',
  columnCount: 2,
  trailingDelimiter: false,
  dataOffset: 0,
};
const hertz = { frequencyColumn: 0, frequencyExponent: 0, levelOffsetsDb: [0, 0] };

function bytesOf(text: string): Uint8Array {
  return new Uint8Array(Buffer.from(text));
}

/** Numbers as instruments write them: fixed or with exponent, any sign, leading and trailing zeros, many digits. */
const numberText = fc
  .record({
    sign: fc.constantFrom('', '-', '+'),
    whole: fc.stringMatching(/^\d{0,20}$/),
    decimals: fc.option(fc.stringMatching(/^\d{0,20}$/)),
    exponent: fc.option(
      fc.tuple(fc.constantFrom('e', 'E'), fc.constantFrom('', '+', '-'), fc.integer({ min: 0, max: 40 })),
    ),
  })
  .filter(({ whole, decimals }) => whole !== '' || (decimals ?? '') !== '')
  .map(({ sign, whole, decimals, exponent }) => {
    const fraction = decimals === null ? '' : `.${decimals}`;
    return `${sign}${whole}${fraction}${exponent === null ? '' : exponent.join('')}`;
  });

describe('scanColumns', () => {
  it('reads every number as Number() does', () => {
    fc.assert(
      fc.property(fc.array(fc.tuple(numberText, numberText), { minLength: 1, maxLength: 20 }), (rows) => {
        const text = rows.map((row) => row.join(',')).join('\n') + '\n';
        const { frequenciesHz, columns, brokenRow } = scanColumns(bytesOf(text), layout, hertz);
        expect(brokenRow).toBeNull();
        expect([...frequenciesHz]).toEqual(rows.map(([frequency]) => Number(frequency)));
        expect([...columns[1]]).toEqual(rows.map(([, level]) => Math.fround(Number(level)) + 0));
      }),
      { numRuns: 2000 },
    );
  });

  it('turns frequencies of any unit into exactly the hertz that are written', () => {
    const decimal = fc.tuple(fc.integer({ min: 0, max: 99_999 }), fc.stringMatching(/^\d{1,9}$/));
    fc.assert(
      fc.property(decimal, fc.constantFrom(0, 3, 6, 9), ([whole, decimals], frequencyExponent) => {
        const text = `${whole}.${decimals}`;
        const { frequenciesHz } = scanColumns(bytesOf(`${text},1\n`), layout, { ...hertz, frequencyExponent });
        expect(frequenciesHz[0]).toBe(Number(`${text}e${frequencyExponent}`));
      }),
    );
    const { frequenciesHz } = scanColumns(bytesOf('0.15,1\n0.1545,1\n29.9985,1\n'), layout, {
      ...hertz,
      frequencyExponent: 6,
    });
    expect([...frequenciesHz]).toEqual([150_000, 154_500, 29_998_500]);
  });

  it('reads decimal commas, tabs, blanks around numbers, both line ends and a delimiter at the end', () => {
    const text = '0,15 ; 45,3;\r\n 0,16;-4,5E+01 ; \n';
    const { frequenciesHz, columns, brokenRow } = scanColumns(
      bytesOf(text),
      { ...layout, delimiter: ';', decimalMark: ',', trailingDelimiter: true },
      { ...hertz, frequencyExponent: 6 },
    );
    expect(brokenRow).toBeNull();
    expect([...frequenciesHz]).toEqual([150_000, 160_000]);
    expect([...columns[1]]).toEqual([Math.fround(45.3), -45]);
    expect(scanColumns(bytesOf('1\t2\n'), { ...layout, delimiter: '\t' }, hertz).columns[1][0]).toBe(2);
  });

  it('adds its offset to every level column before it is rounded to 32 bits', () => {
    const { frequenciesHz, columns } = scanColumns(
      bytesOf('7,1,150\n8,2,160\n'),
      { ...layout, columnCount: 3 },
      { frequencyColumn: 2, frequencyExponent: 3, levelOffsetsDb: [60, 106.9897, 5] },
    );
    expect([...frequenciesHz]).toEqual([150_000, 160_000]);
    expect([...columns[0]]).toEqual([67, 68]);
    expect([...columns[1]]).toEqual([Math.fround(107.9897), Math.fround(108.9897)]);
    expect(columns[2]).toHaveLength(0);
  });

  it.each([
    ['a unit behind a number', '3,45 dB'],
    ['letters in a number', '12abc,45'],
    ['NaN', '3,NaN'],
    ['an empty cell', '3,'],
    ['a missing column', '3'],
    ['an extra column', '3,4,5'],
    ['a sign alone', '3,-'],
    ['a point alone', '3,.'],
    ['an exponent without digits', '3,4e'],
    ['an exponent sign without digits', '3,4e+'],
    ['two decimal points', '3,4.5.6'],
    ['another delimiter', '3;4'],
    ['a thousands blank', '3 000,4'],
    ['hexadecimal', '0x10,4'],
    ['a blank line', ''],
  ])('stops at a row with %s', (_name, row) => {
    const { frequenciesHz, brokenRow } = scanColumns(bytesOf(`1,2\n${row}\n4,5\n`), layout, hertz);
    expect(brokenRow).toEqual({ offset: 4, row: 1 });
    expect([...frequenciesHz]).toEqual([1]);
  });

  it('reads rows shorter than the first, however many', () => {
    const rows = Array.from({ length: 5000 }, (_, i) => `${i + 1},2`);
    const text = `0.0000000000000000000000000000000000000001,2\n${rows.join('\n')}\n`;
    const { frequenciesHz, columns } = scanColumns(bytesOf(text), layout, hertz);
    expect(frequenciesHz).toHaveLength(5001);
    expect(frequenciesHz[5000]).toBe(5000);
    expect(columns[1].every((level) => level === 2)).toBe(true);
  });
});
