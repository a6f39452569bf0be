import type { Problem } from '@shared/contracts/problem';
import { excerptAround, readingFault } from './reading-fault';

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

  it('says a contradiction once, with the words people have for the tag, and what to do', () => {
    const contradiction: Problem = {
      ...unreadable,
      type: '/problems/contradiction',
      detail: 'rbwHz: the file says 9 kHz, the tags say 120 kHz',
      line: undefined,
      column: undefined,
      found: '9 kHz',
      expected: '120 kHz',
    };
    expect(readingFault(contradiction)).toEqual({
      place: '',
      line: null,
      found: '',
      expected: '',
      happened: 'Resolution bandwidth: the file says 9 kHz, the tags say 120 kHz',
      advice: 'Correct the tag, or leave it to the file, and import the file again.',
    });
    expect(readingFault({ ...contradiction, advice: 'Choose trace 2.' }).advice).toBe('Choose trace 2.');
  });

  it('starts a place that is a column alone with a capital', () => {
    expect(readingFault({ ...unreadable, line: undefined }).place).toBe('Column 2');
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
