import { changeSplit } from './change-split';

// The identity of judging: margin = limit - level, so a change of margin is the limit's change less the level's.
it('adds up to the change of margin', () => {
  const parts = changeSplit({
    moved: true,
    fromHz: 195_134,
    toHz: 156_043,
    levelChangeDb: 8.37,
    limitChangeDb: 1.85,
  });
  const sumDb = parts.reduce((sum, { marginChangeDb }) => sum + marginChangeDb, 0);
  expect(sumDb).toBeCloseTo(1.85 - 8.37, 10);
  expect(parts.map(({ text }) => text)).toEqual([
    'The level at the worst point rose by 8.4 dB, going from 195.1 kHz to 156 kHz.',
    'The limit is 1.9 dB higher there.',
  ]);
});

it('says so when the point stayed where it was', () => {
  const [level, limit] = changeSplit({
    moved: false,
    fromHz: 1.2e6,
    toHz: 1.2e6,
    levelChangeDb: 3,
    limitChangeDb: 0.04,
  });
  expect(level.text).toBe('The level at the worst point rose by 3.0 dB at 1.2 MHz.');
  expect(limit).toEqual({ what: 'limit', marginChangeDb: 0.04, text: 'The limit is the same at both.' });
});

it('names a fall that a lower limit outweighed', () => {
  const [level, limit] = changeSplit({ moved: true, fromHz: 4e5, toHz: 6e5, levelChangeDb: -1, limitChangeDb: -4 });
  expect(level.text).toContain('fell by 1.0 dB');
  expect(limit.text).toBe('The limit is 4.0 dB lower there.');
});
