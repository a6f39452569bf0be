import { judgedChange } from './judged-change';

describe('judgedChange', () => {
  it('is the change of the tightest band that lost, not the largest one', () => {
    const bands = [
      { verdict: 'lost', differenceDb: -9.4, marginDb: 6.1 },
      { verdict: 'lost', differenceDb: -6.5, marginDb: -2.5 },
      { verdict: 'held', differenceDb: 0.2, marginDb: -3 },
    ] as const;
    expect(judgedChange(bands)).toBe(-6.5);
  });

  it('is that of the tightest band when none lost', () => {
    const bands = [
      { verdict: 'gained', differenceDb: 5, marginDb: 12 },
      { verdict: 'held', differenceDb: 0.3, marginDb: 4 },
    ] as const;
    expect(judgedChange(bands)).toBe(0.3);
  });

  it('is nothing when nothing was compared', () => {
    expect(judgedChange([{ verdict: 'cannotSay', differenceDb: null, marginDb: 4 }])).toBeNull();
  });
});
