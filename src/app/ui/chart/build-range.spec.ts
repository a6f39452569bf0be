import { rangeWithin, zoomedBuilds } from './build-range';

const WHOLE = { from: 0, to: 30 };

it('keeps of a range what exists, and shows all builds when that is too little', () => {
  expect(rangeWithin(undefined, WHOLE)).toEqual(WHOLE);
  expect(rangeWithin({ from: 10, to: 90 }, WHOLE)).toEqual({ from: 10, to: 30 });
  expect(rangeWithin({ from: 40, to: 90 }, WHOLE)).toEqual(WHOLE);
  expect(rangeWithin({ from: NaN, to: 9 }, WHOLE)).toEqual(WHOLE);
});

it('zooms to every build a drag touched, from within a zoomed range too', () => {
  expect(zoomedBuilds({ from: 10, to: 20 }, { fromFraction: 0.25, toFraction: 0.51 })).toEqual({ from: 12, to: 16 });
  expect(zoomedBuilds(WHOLE, { fromFraction: 0.5, toFraction: 0.51 })).toEqual(WHOLE);
});
