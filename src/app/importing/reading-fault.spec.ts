import type { Problem } from '@shared/contracts/problem';
import { asksForUnits, excerptAround, readingFault } from './reading-fault';

const unreadable: Problem = {
  type: '/problems/unreadable',
  title: 'The file cannot be read',
  status: 422,
  detail: 'Line 214, column 2: found "overload", expected a number with decimal point.',
  line: 214,
  column: 2,
  found: '"overload"',
  expected: 'a number with decimal point',
};

describe('readingFault', () => {
  it('says where, what was found and what was expected, and nothing twice', () => {
    expect(readingFault(unreadable)).toEqual({
      place: 'Line 214, column 2',
      line: 214,
      found: '"overload"',
      expected: 'a number with decimal point',
      happened: '',
      advice: '',
    });
  });

  it('keeps the sentence of a contradiction, which names both sides', () => {
    const fault = readingFault({
      ...unreadable,
      type: '/problems/contradiction',
      detail: 'detector: the file says QP, the tags say AV',
      line: undefined,
      column: undefined,
      found: 'QP',
      expected: 'AV',
      advice: 'Choose trace 2.',
    });
    expect(fault).toMatchObject({
      place: '',
      line: null,
      happened: 'detector: the file says QP, the tags say AV',
      advice: 'Choose trace 2.',
    });
  });

  it('starts a place that is a column alone with a capital', () => {
    expect(readingFault({ ...unreadable, line: undefined }).place).toBe('Column 2');
  });
});

describe('asksForUnits', () => {
  it('sees when choosing a unit is the way out', () => {
    const detail = 'Column 2: found no unit of level, expected dBuV, dBm or dBmV, in the file or given with it.';
    expect(asksForUnits({ ...unreadable, detail })).toBe(true);
    expect(asksForUnits(unreadable)).toBe(false);
  });
});

describe('excerptAround', () => {
  it('shows the line with two on either side, numbered, whatever ends lines', () => {
    expect(excerptAround('a\r\nb\nc\rd\ne\nf', 3).map(({ number, text }) => `${number} ${text}`)).toEqual([
      '1 a',
      '2 b',
      '3 c',
      '4 d',
      '5 e',
    ]);
  });

  it('stops at the ends of the file and cuts lines that no screen holds', () => {
    const [first, second] = excerptAround(`${'x'.repeat(500)}\nb`, 1);
    expect(first.text).toHaveLength(160);
    expect(second).toEqual({ number: 2, text: 'b' });
  });
});
