import { marginColour, MarginRamp, parseRgb } from './margin-ramp';

const RAMP: MarginRamp = {
  plenty: [0, 0, 100],
  ample: [0, 0, 150],
  clear: [0, 0, 250],
  near: [250, 250, 0],
  tight: [150, 150, 0],
  over: [250, 0, 0],
  farOver: [100, 0, 0],
};

describe('marginColour', () => {
  it('steps at 0 dB and at the target', () => {
    expect(marginColour(-0.001, 6, RAMP)).toEqual([250, 0, 0]);
    expect(marginColour(0, 6, RAMP)).toEqual([150, 150, 0]);
    expect(marginColour(5.9999, 6, RAMP)).toEqual([250, 250, 0]);
    expect(marginColour(6, 6, RAMP)).toEqual([0, 0, 250]);
  });

  it('runs within a stretch and stays at its ends', () => {
    expect(marginColour(3, 6, RAMP)).toEqual([200, 200, 0]);
    expect(marginColour(11, 6, RAMP)).toEqual([0, 0, 200]);
    expect(marginColour(16, 6, RAMP)).toEqual([0, 0, 150]);
    expect(marginColour(80, 6, RAMP)).toEqual([0, 0, 100]);
    expect(marginColour(-40, 6, RAMP)).toEqual([100, 0, 0]);
  });

  it('has no middle stretch without a target', () => {
    expect(marginColour(0, 0, RAMP)).toEqual([0, 0, 250]);
    expect(marginColour(-0.1, 0, RAMP)[0]).toBeGreaterThan(240);
  });
});

it('reads computed colours', () => {
  expect(parseRgb('rgb(11, 58, 91)')).toEqual([11, 58, 91]);
  expect(parseRgb('')).toEqual([0, 0, 0]);
});
