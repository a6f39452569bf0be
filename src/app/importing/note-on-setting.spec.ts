import { noteOnSetting } from './note-on-setting';

const write = (rbwHz: number) => `${rbwHz / 1e3} kHz`;

describe('noteOnSetting', () => {
  it('tells what the files state, or that nothing is known', () => {
    expect(noteOnSetting(null, [9000, 120_000], write)).toBe('In the files: 9 kHz, 120 kHz');
    expect(noteOnSetting(null, [], write)).toBe('Empty: not known');
  });

  it('warns of a tag that denies a file, and of no other', () => {
    expect(noteOnSetting(120_000, [9000], write)).toBe('Files say 9 kHz: those would be refused');
    expect(noteOnSetting(9000, [9000], write)).toBe('');
    expect(noteOnSetting(9000, [], write)).toBe('');
  });
});
