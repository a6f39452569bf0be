import { suggestKind } from './suggest-kind';

describe('suggestKind', () => {
  it.each([
    ['adapter_background_2026-11-29.csv', 'background'],
    ['Ambient L.csv', 'background'],
    ['EUT off.txt', 'background'],
    ['check source march.csv', 'checkSource'],
    ['adapter_l-qp.csv', undefined],
  ])('takes %s for %s', (name, kind) => {
    expect(suggestKind(name)).toBe(kind);
  });
});
