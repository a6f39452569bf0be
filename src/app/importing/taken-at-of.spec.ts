import { aFile, aReading } from '../../../test/builders/draft-builder';
import { takenAtOf } from './taken-at-of';

const reading = aReading([{}], { takenAt: '2026-03-02T08:20:15.000Z' });

describe('takenAtOf', () => {
  it('is what the file says where nobody says otherwise', () => {
    expect(takenAtOf(aFile({ reading }), {})).toEqual({ takenAt: '2026-03-02T08:20:15.000Z', isFromFile: true });
  });

  it('is never the time in the file where somebody typed one, for the file or for all', () => {
    const typed = '2026-03-03T10:00:00.000Z';
    expect(takenAtOf(aFile({ reading }), { takenAt: typed })).toEqual({ takenAt: typed, isFromFile: false });
    const file = aFile({ reading, choice: { takenAt: typed } });
    expect(takenAtOf(file, { takenAt: '2026-03-04T10:00:00.000Z' })).toEqual({ takenAt: typed, isFromFile: false });
  });

  it('is left to the saving where nobody knows', () => {
    expect(takenAtOf(aFile(), {})).toEqual({ takenAt: undefined, isFromFile: false });
    expect(takenAtOf(aFile({ reading: null }), {})).toEqual({ takenAt: undefined, isFromFile: false });
  });
});
