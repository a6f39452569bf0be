import { bestSplit, isLineNotStep } from './step-or-line';

// Annual flow of the Nile at Aswan, 1871-1970, 10^8 m^3. Source: Cobb, Biometrika 65 (1978) 243-251; R datasets, Nile.
const NILE = [
  1120, 1160, 963, 1210, 1160, 1160, 813, 1230, 1370, 1140, 995, 935, 1110, 994, 1020, 960, 1180, 799, 958, 1140, 1100,
  1210, 1150, 1250, 1260, 1220, 1030, 1100, 774, 840, 874, 694, 940, 833, 701, 916, 692, 1020, 1050, 969, 831, 726, 456,
  824, 702, 1120, 1100, 832, 764, 821, 768, 845, 864, 862, 698, 845, 744, 796, 1040, 759, 781, 865, 845, 944, 984, 897,
  822, 1010, 771, 676, 649, 846, 812, 742, 801, 1040, 860, 874, 848, 890, 744, 749, 838, 1050, 918, 986, 797, 923, 975,
  815, 1020, 906, 901, 1170, 912, 746, 919, 718, 714, 740,
];

describe('bestSplit', () => {
  it('puts the change of the Nile after observation 28, 1898 (published breakpoint: R strucchange, Nile)', () => {
    const { at, squaredError } = bestSplit(NILE);
    expect(at).toBe(28);
    // Computed for this series beforehand with another program.
    expect(squaredError).toBeCloseTo(1_597_457.19, 1);
  });

  it('refuses a single value', () => {
    expect(() => bestSplit([1])).toThrow(RangeError);
  });
});

describe('isLineNotStep', () => {
  it('calls the Nile a step, though a trend test finds a trend in it', () => {
    expect(isLineNotStep(NILE)).toBe(false);
  });

  it('tells a steady fall from a fall at once (by hand)', () => {
    expect(isLineNotStep([10, 9.7, 9.4, 9.1, 8.8, 8.5])).toBe(true);
    expect(isLineNotStep([10, 10.1, 9.9, 8, 8.1, 7.9])).toBe(false);
  });
});
