import { referenceInForce } from './reference-in-force';

describe('referenceInForce', () => {
  const choices = [
    { buildId: 20, position: 10 },
    { buildId: 12, position: 4 },
  ];

  it('gives a build after the newest choice that one', () => {
    expect(referenceInForce(choices, 11)).toBe(20);
  });

  it('leaves the builds before a new reference, and the reference itself, the former one', () => {
    expect(referenceInForce(choices, 10)).toBe(12);
    expect(referenceInForce(choices, 5)).toBe(12);
  });

  it('pools where nothing older was chosen', () => {
    expect(referenceInForce(choices, 4)).toBeNull();
    expect(referenceInForce([], 4)).toBeNull();
  });

  it('pools again once the team took its choice back', () => {
    expect(referenceInForce([{ buildId: null, position: null }, ...choices], 11)).toBeNull();
  });
});
