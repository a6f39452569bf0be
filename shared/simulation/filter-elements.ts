import { type Complex, add, complex, divide } from './complex';

/** A capacitor with its series resistance and inductance. */
export interface CapacitorElement {
  capacitanceF: number;
  esrOhm: number;
  eslH: number;
}

/** An inductor with its winding capacitance and core loss, both in parallel. */
export interface InductorElement {
  inductanceH: number;
  windingCapacitanceF: number;
  lossOhm: number;
}

/** Mains filter of one converter, seen from the converter towards the mains. */
export interface InputFilter {
  /** Both Y capacitors together, line and neutral to earth. */
  yCapacitor: CapacitorElement;
  commonModeChoke: InductorElement;
  /** X capacitor on the converter side. */
  converterCapacitor: CapacitorElement;
  /** Differential inductance, mostly the leakage of the common-mode choke. */
  differentialChoke: InductorElement;
  /** X capacitor on the mains side. */
  mainsCapacitor: CapacitorElement;
  /** Mutual inductance between the loops of the two X capacitors in H: what limits the filter at high frequency. */
  bypassH: number;
}

/**
 * Impedance of a real capacitor: ESR + j w ESL + 1 / (j w C).
 *
 * @param element capacitance in F, ESR in ohm, ESL in H
 * @param frequencyHz frequency in Hz, above 0
 * @returns impedance in ohm
 * Source: H. W. Ott, Electromagnetic Compatibility Engineering, ch. 5 (series equivalent circuit of a capacitor).
 * @example capacitorImpedance({ capacitanceF: 1e-6, esrOhm: 0, eslH: 0 }, 159154.94) // { re: 0, im: -1 }
 */
export function capacitorImpedance(element: CapacitorElement, frequencyHz: number): Complex {
  const omega = 2 * Math.PI * frequencyHz;
  return complex(element.esrOhm, omega * element.eslH - 1 / (omega * element.capacitanceF));
}

/**
 * Impedance of a real inductor: L, winding capacitance and loss resistance in parallel.
 *
 * @param element inductance in H, winding capacitance in F, loss in ohm
 * @param frequencyHz frequency in Hz, above 0
 * @returns impedance in ohm; largest (the loss resistance) at 1 / (2 pi sqrt(L C))
 * Source: H. W. Ott, Electromagnetic Compatibility Engineering, ch. 5 (parallel equivalent circuit of an inductor).
 * @example inductorImpedance({ inductanceH: 1e-3, windingCapacitanceF: 10e-12, lossOhm: 20e3 }, 1591549.43) // { re: 20000, im: 0 }
 */
export function inductorImpedance(element: InductorElement, frequencyHz: number): Complex {
  const omega = 2 * Math.PI * frequencyHz;
  const admittance = add(
    complex(1 / element.lossOhm),
    complex(0, omega * element.windingCapacitanceF - 1 / (omega * element.inductanceH)),
  );
  return divide(complex(1), admittance);
}
