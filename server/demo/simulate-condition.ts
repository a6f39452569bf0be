import type { EmissionCondition } from '@shared/simulation/emission-spectrum';
import type { CapacitorElement, InputFilter } from '@shared/simulation/filter-elements';
import { LISN_50UH } from '@shared/simulation/lisn-impedance';
import { createRandom, seedFromText } from '@shared/simulation/random-generator';
import type { SwitchingStage } from '@shared/simulation/switching-stage';
import type { DemoBuild, DemoProduct, DemoSession, FirmwareRevision, HardwareRevision } from './scenario-types';

/** Deviation of stray capacitances between units of one design, 3 % (0.26 dB). */
const UNIT_STRAY_SPREAD = 0.03;

export function hardwareOf(product: DemoProduct, build: { hardware: string }): HardwareRevision {
  return named(product.hardwareRevisions, build.hardware, `${product.key} hardware`);
}

export function firmwareOf(product: DemoProduct, build: { firmware: string }): FirmwareRevision {
  return named(product.firmwareRevisions, build.firmware, `${product.key} firmware`);
}

/**
 * The converter as it was on the bench: board, firmware, lot, unit and operating state put together.
 *
 * @param product with its revisions and states
 * @param build the pair of revisions and its lot
 * @param session names the state, the unit and the set-up
 * @returns stages and filter for the simulation
 * Throws RangeError when a name is not part of the product.
 */
export function conditionOf(
  product: DemoProduct,
  build: DemoBuild,
  session: Pick<DemoSession, 'state' | 'unit' | 'setUp'>,
): EmissionCondition {
  const hardware = hardwareOf(product, build);
  const firmware = firmwareOf(product, build);
  const state = named(product.states, session.state, `${product.key} state`);
  const unitRandom = createRandom(seedFromText(`unit ${product.key} ${session.unit}`));
  const strayFactor = 1 + UNIT_STRAY_SPREAD * unitRandom.nextNormal();
  const unitClock = (product.clockSpread.unitPercent / 100) * unitRandom.nextNormal();
  const setUpSeed = seedFromText(`clock ${product.key} ${build.hardware} ${build.firmware} ${session.setUp}`);
  const setUpClock = (product.clockSpread.sessionPercent / 100) * createRandom(setUpSeed).nextNormal();
  const stages = hardware.stages.flatMap((board): SwitchingStage[] => {
    const operation = state.operation[board.key];
    if (operation === undefined) return [];
    const control = firmware.control[board.key];
    const { differential } = board;
    return [
      {
        ...board,
        frequencyHz: control.frequencyHz * operation.frequencyFactor * (1 + unitClock + setUpClock),
        spreading: control.spreading,
        course: operation.course,
        riseTimeS: board.riseTimeS * control.edgeFactor,
        fallTimeS: board.fallTimeS * control.edgeFactor,
        strayCapacitanceF: board.strayCapacitanceF * strayFactor,
        differential:
          differential.kind === 'pulsedCurrent'
            ? { ...differential, amplitudeA: differential.amplitudeA * operation.currentFactor }
            : differential,
      },
    ];
  });
  return { stages, filter: filterOfLot(hardware.filter, build.lot), lisn: LISN_50UH };
}

function filterOfLot(filter: InputFilter, lot: DemoBuild['lot']): InputFilter {
  const ofLot = (capacitor: CapacitorElement): CapacitorElement => ({
    ...capacitor,
    capacitanceF: capacitor.capacitanceF * lot.capacitance,
  });
  return {
    ...filter,
    converterCapacitor: ofLot(filter.converterCapacitor),
    mainsCapacitor: ofLot(filter.mainsCapacitor),
    differentialChoke: {
      ...filter.differentialChoke,
      inductanceH: filter.differentialChoke.inductanceH * lot.differentialInductance,
    },
  };
}

function named<T extends { name: string }>(list: T[], name: string, what: string): T {
  const found = list.find((entry) => entry.name === name);
  if (found === undefined) {
    throw new RangeError(`${what} "${name}" is not part of the scenario`);
  }
  return found;
}
