import { type Complex, complex, parallel } from './complex';

/** A line impedance stabilisation network by its nominal EUT-port elements. */
export interface LisnNetwork {
  inductanceH: number;
  /** Resistance in series with the inductance: 5 ohm in the 9 kHz-30 MHz network, 0 in the 150 kHz-30 MHz one. */
  seriesResistanceOhm: number;
}

export const LISN_50UH: LisnNetwork = { inductanceH: 50e-6, seriesResistanceOhm: 0 };
export const LISN_50UH_5OHM: LisnNetwork = { inductanceH: 50e-6, seriesResistanceOhm: 5 };

const RECEIVER_OHM = 50;

/**
 * Nominal impedance of one line of a LISN at its EUT port, measuring port loaded with 50 ohm.
 *
 * Z = 50 || (Rs + j 2 pi f L)
 *
 * @param network inductance in H and series resistance in ohm
 * @param frequencyHz frequency in Hz, above 0
 * @returns impedance in ohm
 * Source: CISPR 16-1-2, nominal impedance of the V-networks (clause and table by your edition).
 * @example magnitude(lisnImpedance(LISN_50UH, 150e3)) // 34.29
 */
export function lisnImpedance(network: LisnNetwork, frequencyHz: number): Complex {
  const branch = complex(network.seriesResistanceOhm, 2 * Math.PI * frequencyHz * network.inductanceH);
  return parallel(complex(RECEIVER_OHM), branch);
}
