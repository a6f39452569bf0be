import { magnitude, complex } from './complex';
import { lineTransfers, modeTransfers } from './conducted-path';
import { type InputFilter, capacitorImpedance, inductorImpedance } from './filter-elements';
import { LISN_50UH } from './lisn-impedance';
import type { SwitchingStage } from './switching-stage';

const IDEAL_CAPACITOR = { esrOhm: 0, eslH: 0 };
const IDEAL_INDUCTOR = { windingCapacitanceF: 1e-18, lossOhm: 1e12 };

/** A filter whose parts are all but absent. */
const NO_FILTER: InputFilter = {
  yCapacitor: { ...IDEAL_CAPACITOR, capacitanceF: 1e-18 },
  commonModeChoke: { ...IDEAL_INDUCTOR, inductanceH: 1e-15 },
  converterCapacitor: { ...IDEAL_CAPACITOR, capacitanceF: 1e-18 },
  differentialChoke: { ...IDEAL_INDUCTOR, inductanceH: 1e-15 },
  mainsCapacitor: { ...IDEAL_CAPACITOR, capacitanceF: 1e-18 },
  bypassH: 0,
};

const STAGE: SwitchingStage = {
  key: 'stage',
  frequencyHz: 100e3,
  spreading: null,
  course: { kind: 'steady', duty: 0.5 },
  swingV: 100,
  riseTimeS: 50e-9,
  fallTimeS: 50e-9,
  strayCapacitanceF: 1e-12,
  differential: { kind: 'pulsedCurrent', amplitudeA: 1 },
  ringing: { frequencyHz: 20e6, quality: 5, heightDb: 0 },
};

const decibels = (ratio: number): number => 20 * Math.log10(ratio);

describe('modeTransfers', () => {
  // Source: I_CM = 2 V_CM / 50, 25 ohm seen by the common-mode current well above 150 kHz (C. R. Paul, Introduction to
  // Electromagnetic Compatibility, ch. 6): V_CM = 2 pi f C * 25 ohm per volt while 1 / (2 pi f C) is far above 25 ohm.
  it('drives a small stray capacitance through 25 ohm when there is no filter', () => {
    const { commonMode } = modeTransfers(STAGE, NO_FILTER, LISN_50UH, 5e6);
    expect(magnitude(commonMode)).toBeCloseTo(2 * Math.PI * 5e6 * 1e-12 * 25, 6);
  });

  // Source: V_DM = 50 I_DM per line (Paul, ch. 6): 1 A per 100 V gives 0.5 V per volt.
  it('drives the differential current through 50 ohm of each line when there is no filter', () => {
    const { differentialMode } = modeTransfers(STAGE, NO_FILTER, LISN_50UH, 5e6);
    expect(magnitude(differentialMode)).toBeCloseTo(0.5, 3);
  });

  // Source: an LC low-pass falls by 40 dB a decade well above its resonance and the voltage on the shunt capacitor of a current
  // source by another 20 dB (any network theory book).
  it('lowers differential mode by 60 dB a decade with ideal capacitor, inductor and capacitor', () => {
    const filter: InputFilter = {
      ...NO_FILTER,
      converterCapacitor: { ...IDEAL_CAPACITOR, capacitanceF: 1e-6 },
      differentialChoke: { ...IDEAL_INDUCTOR, inductanceH: 1e-3 },
      mainsCapacitor: { ...IDEAL_CAPACITOR, capacitanceF: 1e-6 },
    };
    const at = (frequencyHz: number): number =>
      magnitude(modeTransfers(STAGE, filter, LISN_50UH, frequencyHz).differentialMode);
    expect(decibels(at(300e3) / at(3e6))).toBeCloseTo(60, 0);
  });

  it('raises both modes by the height of the hump at the ringing frequency', () => {
    const ringing = { frequencyHz: 10e6, quality: 6, heightDb: 12 };
    const plain = modeTransfers(STAGE, NO_FILTER, LISN_50UH, 10e6);
    const humped = modeTransfers({ ...STAGE, ringing }, NO_FILTER, LISN_50UH, 10e6);
    expect(decibels(magnitude(humped.commonMode) / magnitude(plain.commonMode))).toBeCloseTo(12, 6);
  });
});

describe('lineTransfers', () => {
  // Source: V_L = CM + DM, V_N = CM - DM, so (L^2 + N^2) / 2 = CM^2 + DM^2 (parallelogram law).
  it('gives line and neutral whose squares add to those of the modes', () => {
    const modes = { commonMode: complex(0.3, 0.4), differentialMode: complex(-0.2, 0.1) };
    const { lineL, lineN } = lineTransfers(modes);
    expect((lineL ** 2 + lineN ** 2) / 2).toBeCloseTo(0.25 + 0.05, 12);
    expect(lineL).not.toBeCloseTo(lineN, 2);
  });
});

describe('filter elements', () => {
  // Source: resonance at 1 / (2 pi sqrt(L C)); 1 uF with 14 nH is at 1.345 MHz, 1 mH with 10 pF at 1.592 MHz.
  it('leaves the series resistance of a capacitor and the loss of an inductor at their resonances', () => {
    const capacitor = { capacitanceF: 1e-6, esrOhm: 0.03, eslH: 14e-9 };
    const inductor = { inductanceH: 1e-3, windingCapacitanceF: 10e-12, lossOhm: 20e3 };
    expect(magnitude(capacitorImpedance(capacitor, 1 / (2 * Math.PI * Math.sqrt(14e-15))))).toBeCloseTo(0.03, 9);
    expect(magnitude(inductorImpedance(inductor, 1 / (2 * Math.PI * Math.sqrt(1e-14))))).toBeCloseTo(20e3, 3);
  });
});
