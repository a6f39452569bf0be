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
