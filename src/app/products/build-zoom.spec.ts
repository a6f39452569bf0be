import { rangeOf, zoomQuery } from './build-zoom';

const ids = [3, 5, 8, 9];

describe('the builds in view in an address', () => {
  it('names the first and the last build, so that builds that come in later move nothing', () => {
    expect(zoomQuery(ids, { from: 1, to: 3 })).toEqual({ first: 5, last: 8 });
    expect(rangeOf([...ids, 12], '5', '8')).toEqual({ from: 1, to: 3 });
  });

  it('says nothing for all builds', () => {
    expect(zoomQuery(ids, { from: 0, to: 4 })).toEqual({ first: null, last: null });
  });

  it.each([
    [undefined, '9'],
    ['9', '3'],
    ['5', '5'],
    ['7', '9'],
  ])('does not take %s to %s for a range', (first, last) => {
    expect(rangeOf(ids, first, last)).toBeUndefined();
  });
});
