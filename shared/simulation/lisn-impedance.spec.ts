import { magnitude, phaseDegrees } from './complex';
import { LISN_50UH, LISN_50UH_5OHM, lisnImpedance } from './lisn-impedance';

describe('lisnImpedance', () => {
  // Source: CISPR 16-1-2, nominal impedance tables of the 50 uH networks, recomputed from 50 || (Rs + j w L).
  it.each([
    [LISN_50UH_5OHM, 0.009, 5.21, 26.54],
    [LISN_50UH_5OHM, 0.05, 14.41, 56.4],
    [LISN_50UH_5OHM, 0.15, 32.71, 43.35],
    [LISN_50UH_5OHM, 1, 49.26, 9.02],
    [LISN_50UH, 0.15, 34.29, 46.7],
    [LISN_50UH, 0.5, 47.64, 17.66],
    [LISN_50UH, 5, 49.97, 1.82],
    [LISN_50UH, 30, 50, 0.3],
  ])('gives the nominal magnitude and phase (%#)', (network, frequencyMhz, ohm, degrees) => {
    const impedance = lisnImpedance(network, frequencyMhz * 1e6);
    expect(magnitude(impedance)).toBeCloseTo(ohm, 1);
    expect(phaseDegrees(impedance)).toBeCloseTo(degrees, 1);
  });
});
