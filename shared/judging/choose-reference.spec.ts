import { chooseReference, type EarlierBuild } from './choose-reference';
import type { ReasonCode } from './band-judgement';
import type { Verdict } from './verdict';

const builds = (...verdicts: (Verdict | [Verdict, ReasonCode, number | null] | null)[]): EarlierBuild[] =>
  verdicts.map((entry, index) => {
    if (entry === null) return { buildId: index + 1, judgement: null };
    const [verdict, code, differenceDb] = Array.isArray(entry) ? entry : [entry, null, 0];
    const reasons = code ? [{ code, text: code }] : [];
    return { buildId: index + 1, judgement: { verdict, reasons, differenceDb, thresholdDb: 2 } };
  });
const FIRST: [Verdict, ReasonCode, null] = ['cannotSay', 'noReference', null];

describe('chooseReference', () => {
  it('has none before the first measured build', () => {
    expect(chooseReference([], null)).toEqual({ kind: 'none', buildIds: [], historyIds: [] });
  });

  it('takes the first build alone for the second', () => {
    expect(chooseReference(builds(FIRST), null)).toMatchObject({ kind: 'pooled', buildIds: [1] });
  });

  it('pools the latest five held since the last change, with the build of the change', () => {
    expect(chooseReference(builds(FIRST, 'held', 'lost', 'held', 'held'), null).buildIds).toEqual([3, 4, 5]);
    expect(chooseReference(builds(FIRST, 'held', 'held', 'held', 'held', 'held', 'held'), null).buildIds).toEqual([
      3, 4, 5, 6, 7,
    ]);
  });

  it('leaves out builds that a guard stopped, from the spread too', () => {
    const reference = chooseReference(builds(FIRST, 'held', ['cannotSay', 'constantOffset', -10], 'held'), null);
    expect(reference).toMatchObject({ buildIds: [1, 2, 4], historyIds: [1, 2, 4] });
  });

  it('fills up with builds undecided within half the threshold, never with one that looks like a loss', () => {
    const reference = chooseReference(
      builds(FIRST, ['cannotSay', 'withinSpread', -0.8], ['cannotSay', 'withinSpread', -1.1], 'held'),
      null,
    );
    expect(reference).toMatchObject({ buildIds: [1, 2, 4], historyIds: [1, 2, 3, 4] });
  });

  it('needs no filling up once five are settled', () => {
    const reference = chooseReference(
      builds(FIRST, 'held', 'held', 'held', 'held', ['cannotSay', 'withinSpread', 0.5]),
      null,
    );
    expect(reference.buildIds).toEqual([1, 2, 3, 4, 5]);
  });

  it("takes the team's choice, and none rather than another when it was not measured here", () => {
    expect(chooseReference(builds(FIRST, 'held', 'lost'), 1)).toMatchObject({ kind: 'chosen', buildIds: [1] });
    expect(chooseReference(builds(FIRST, 'held'), 77)).toMatchObject({ kind: 'none', buildIds: [] });
  });

  it('takes losses in a row against one chosen build for one level', () => {
    expect(chooseReference(builds(FIRST, 'held', 'lost', 'lost', 'lost'), 1).historyIds).toEqual([3, 4, 5]);
  });
});
