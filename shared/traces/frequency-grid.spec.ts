import fc from 'fast-check';
import { describeGrid, findFrequencyFault, firstIndexAbove, firstIndexAtOrAbove } from './frequency-grid';

describe('findFrequencyFault', () => {
  it.each([
    [[150, 160, 170], null],
    [[0, 160, 170], { index: 0, rule: 'notPositive' }],
    [[150, -160, 170], { index: 1, rule: 'notPositive' }],
    [[150, NaN, 170], { index: 1, rule: 'notPositive' }],
    [[150, 160, 155], { index: 2, rule: 'falling' }],
    [[150, 160, 160], { index: 2, rule: 'repeated' }],
  ])('judges %j', (frequenciesHz, fault) => {
    expect(findFrequencyFault(Float64Array.from(frequenciesHz))).toEqual(fault);
  });
});

describe('describeGrid', () => {
  it('states a receiver grid of half a bandwidth from 150 kHz to 30 MHz', () => {
    const frequenciesHz = Float64Array.from({ length: 6634 }, (_, i) => 150_000 + 4500 * i);
    expect(describeGrid(frequenciesHz)).toEqual({
      pointCount: 6634,
      startHz: 150_000,
      stopHz: 29_998_500,
      medianStepHz: 4500,
    });
  });

  it('refuses a single point and a grid that does not rise', () => {
    expect(() => describeGrid(Float64Array.of(1))).toThrow(RangeError);
    expect(() => describeGrid(Float64Array.of(2, 1))).toThrow(/point 1 is 1 Hz \(falling\)/);
  });
});

describe('firstIndexAtOrAbove and firstIndexAbove', () => {
  it('agree with a search from the start', () => {
    fc.assert(
      fc.property(
        fc.uniqueArray(fc.integer({ min: 1, max: 60 })),
        fc.integer({ min: 0, max: 61 }),
        (numbers, sought) => {
          const rising = numbers.sort((a, b) => a - b);
          const gridHz = Float64Array.from(rising);
          expect(firstIndexAtOrAbove(gridHz, sought)).toBe(rising.filter((one) => one < sought).length);
          expect(firstIndexAbove(gridHz, sought)).toBe(rising.filter((one) => one <= sought).length);
        },
      ),
    );
  });
});
