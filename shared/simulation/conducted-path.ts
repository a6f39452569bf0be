import { type Complex, add, complex, divide, magnitude, multiply, parallel, scale, subtract } from './complex';
import { type InputFilter, capacitorImpedance, inductorImpedance } from './filter-elements';
import { type LisnNetwork, lisnImpedance } from './lisn-impedance';
import type { SwitchingStage } from './switching-stage';

/** Voltage on each LISN line per volt of the switched node, by mode. */
export interface ModeTransfers {
  /** V_CM = (V_L + V_N) / 2 per V. */
  commonMode: Complex;
  /** V_DM = (V_L - V_N) / 2 per V. */
  differentialMode: Complex;
}

/**
 * Transfer from the switched node of a stage to the two modes at the LISN.
 *
 * Common mode: node - stray capacitance - Y capacitors - common-mode choke - both lines in parallel (Z_LISN / 2).
 * Differential mode: input current - X capacitor - differential inductance - X capacitor - both lines in series (2 Z_LISN),
 * plus the mutual inductance that bypasses the filter. V_DM is half of the voltage between the lines.
 *
 * @param stage stray capacitance, differential source and ringing are used
 * @param filter the mains filter
 * @param lisn the network at the mains port
 * @param frequencyHz frequency in Hz, above 0
 * @returns both transfers, dimensionless
 * Source: C. R. Paul, Introduction to Electromagnetic Compatibility, 2nd ed., ch. 6 (power-supply filters and the LISN);
 * V_L = CM + DM, V_N = CM - DM.
 * @example with 1 pF, no Y capacitor and no choke the common-mode transfer at 1 MHz is about j 2 pi f C * 25 ohm = 0.00016
 */
export function modeTransfers(
  stage: SwitchingStage,
  filter: InputFilter,
  lisn: LisnNetwork,
  frequencyHz: number,
): ModeTransfers {
  const line = lisnImpedance(lisn, frequencyHz);
  const ringing = ringingFactor(stage.ringing, frequencyHz);
  return {
    commonMode: multiply(ringing, commonModeTransfer(stage, filter, line, frequencyHz)),
    differentialMode: multiply(ringing, differentialModeTransfer(stage, filter, line, frequencyHz)),
  };
}

/** Magnitudes on line and neutral of one source phasor: |CM + DM| and |CM - DM|. */
export function lineTransfers(modes: ModeTransfers): { lineL: number; lineN: number } {
  return {
    lineL: magnitude(add(modes.commonMode, modes.differentialMode)),
    lineN: magnitude(subtract(modes.commonMode, modes.differentialMode)),
  };
}

function commonModeTransfer(stage: SwitchingStage, filter: InputFilter, line: Complex, frequencyHz: number): Complex {
  const stray = complex(0, -1 / (2 * Math.PI * frequencyHz * stage.strayCapacitanceF));
  const load = scale(line, 0.5);
  const branch = add(inductorImpedance(filter.commonModeChoke, frequencyHz), load);
  const node = parallel(capacitorImpedance(filter.yCapacitor, frequencyHz), branch);
  return multiply(divide(node, add(node, stray)), divide(load, branch));
}

function differentialModeTransfer(
  stage: SwitchingStage,
  filter: InputFilter,
  line: Complex,
  frequencyHz: number,
): Complex {
  const output = parallel(capacitorImpedance(filter.mainsCapacitor, frequencyHz), scale(line, 2));
  const branch = add(inductorImpedance(filter.differentialChoke, frequencyHz), output);
  const node = parallel(capacitorImpedance(filter.converterCapacitor, frequencyHz), branch);
  const source = stage.differential;
  const currentPerVolt =
    source.kind === 'inductorRipple'
      ? divide(complex(1), add(inductorImpedance(source.inductor, frequencyHz), node))
      : complex(source.amplitudeA / stage.swingV);
  const filtered = multiply(node, divide(output, branch));
  const bypass = complex(0, 2 * Math.PI * frequencyHz * filter.bypassH);
  return scale(multiply(currentPerVolt, add(filtered, bypass)), 0.5);
}

/** 1 + k times a resonance of unit height at the ringing frequency; 1 + k is the height of the hump. */
function ringingFactor(ringing: SwitchingStage['ringing'], frequencyHz: number): Complex {
  const ratio = frequencyHz / ringing.frequencyHz;
  const damping = complex(0, ratio / ringing.quality);
  const resonance = divide(damping, add(complex(1 - ratio * ratio), damping));
  return add(complex(1), scale(resonance, 10 ** (ringing.heightDb / 20) - 1));
}
