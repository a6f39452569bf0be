import { toCsv } from './to-csv';

it('writes rows with CR LF and quotes what needs it (RFC 4180)', () => {
  expect(
    toCsv([
      ['sweep', 'levelDbuv'],
      ['C1, "hot"', 55.5],
      [null, 0],
    ]),
  ).toBe('sweep,levelDbuv\r\n"C1, ""hot""",55.5\r\n,0\r\n');
});

it('keeps a spreadsheet from running a text as a formula, and leaves numbers and line names alone', () => {
  expect(toCsv([['=1+1', '@cmd', '-', '+', '-3.2', -3.2, '+5 V rail']])).toBe(
    "'=1+1,'@cmd,-,+,-3.2,-3.2,'+5 V rail\r\n",
  );
});
