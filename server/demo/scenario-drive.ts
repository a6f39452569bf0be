import { type BuildRow, DAY_MS, writeBuilds } from './scenario-builds';
import type { DemoProduct, DemoState, FirmwareControl, FirmwareRevision, HardwareRevision } from './scenario-types';

const RATED = '230 V rated speed';
const SLOW = '230 V creep speed';
const STANDBY = '230 V enabled, standing';

/**
 * The drive's story: firmware 2.3.0 strengthens the gate drive to save switching losses; the edges get 2.3 times as fast, and
 * everything above 3 MHz rises by up to 7 dB. The team accepts it (margin left is enough, the heat sink gets smaller) and makes 2.3.0
 * the new reference.
 * Beside it: three builds nobody measured in a row, a second unit, and runs on the open bench with its broadcast pick-up.
 */
export function driveProduct(nowMs: number): DemoProduct {
  return {
    key: 'drive-1500',
    name: 'Millrace 1.5 kW motor drive',
    description: 'Single-phase frequency converter, 16 kHz pulse width modulation, 10 m motor cable.',
    teamKey: 'drives-lighting',
    limitSetKey: 'CISPR32_A',
    targetMarginDb: 3,
    sharedWith: [],
    states: STATES,
    units: ['DR-0031', 'DR-0034'],
    hardwareRevisions: HARDWARE,
    firmwareRevisions: FIRMWARE,
    builds: writeBuilds(
      HISTORY,
      { states: [RATED, SLOW, STANDBY], unit: 'DR-0031', bench: 'bench-2', hourUtc: 1 },
      nowMs,
    ),
    references: [
      {
        build: { hardware: 'M2', firmware: '2.1.0' },
        chosenAtMs: nowMs - 150 * DAY_MS,
        chosenByEmail: 'hanae.morwick@brackenholt.example',
        reason: 'First series release.',
      },
      {
        build: { hardware: 'M2', firmware: '2.3.0' },
        chosenAtMs: nowMs - 72 * DAY_MS,
        chosenByEmail: 'hanae.morwick@brackenholt.example',
        reason: 'Faster edges accepted; new starting point.',
      },
    ],
    dropActions: [
      {
        build: { hardware: 'M2', firmware: '2.3.0' },
        band: null,
        ownerEmail: 'edric.salloway@brackenholt.example',
        afterDays: 9,
        becomes: 'accepted',
        fixedBy: null,
        note: 'Gate resistor setting 3 of the driver, wanted for the smaller heat sink. Margin left above 5 MHz is over target.',
      },
    ],
    clockSpread: { unitPercent: 0.005, sessionPercent: 0.001 },
  };
}

function state(name: string, load: string, mode: string, depth: number, auxiliaryCurrent: number): DemoState {
  return {
    name,
    supplyVoltageV: 230,
    supplyFrequencyHz: 50,
    load,
    mode,
    isRequired: true,
    operation: {
      inverter: { course: { kind: 'inverterLeg', depth }, frequencyFactor: 1, currentFactor: 1 },
      auxiliary: {
        course: { kind: 'steady', duty: 0.31 },
        frequencyFactor: 1,
        currentFactor: auxiliaryCurrent,
      },
    },
  };
}

const STATES: DemoState[] = [
  state(RATED, '1.1 kW at the shaft', 'speed control, 50 Hz', 0.92, 1),
  state(SLOW, '0.1 kW at the shaft', 'speed control, 3 Hz', 0.1, 1),
  state(STANDBY, 'none', 'holding, zero speed', 0.02, 0.8),
];

const BOARD_M1: HardwareRevision = {
  name: 'M1',
  notes: 'Pilot series.',
  filter: {
    yCapacitor: { capacitanceF: 20e-9, esrOhm: 0.08, eslH: 11e-9 },
    commonModeChoke: { inductanceH: 9e-3, windingCapacitanceF: 55e-12, lossOhm: 18e3 },
    converterCapacitor: { capacitanceF: 1e-6, esrOhm: 0.03, eslH: 15e-9 },
    differentialChoke: { inductanceH: 70e-6, windingCapacitanceF: 10e-12, lossOhm: 3e3 },
    mainsCapacitor: { capacitanceF: 0.47e-6, esrOhm: 0.03, eslH: 15e-9 },
    bypassH: 1.4e-9,
  },
  stages: [
    {
      key: 'inverter',
      swingV: 325,
      riseTimeS: 210e-9,
      fallTimeS: 190e-9,
      strayCapacitanceF: 600e-12,
      differential: { kind: 'pulsedCurrent', amplitudeA: 0.12 },
      ringing: { frequencyHz: 7.5e6, quality: 3, heightDb: 6 },
    },
    {
      key: 'auxiliary',
      swingV: 420,
      riseTimeS: 60e-9,
      fallTimeS: 40e-9,
      strayCapacitanceF: 9e-12,
      differential: { kind: 'pulsedCurrent', amplitudeA: 0.01 },
      ringing: { frequencyHz: 13e6, quality: 8, heightDb: 8 },
    },
  ],
};

const HARDWARE: HardwareRevision[] = [
  BOARD_M1,
  {
    ...BOARD_M1,
    name: 'M2',
    notes: 'Series board, X capacitor nearer to the terminals.',
    filter: { ...BOARD_M1.filter, bypassH: 1.1e-9 },
  },
];

function firmware(name: string, commit: string, notes: string, edgeFactor = 1): FirmwareRevision {
  const control: Record<string, FirmwareControl> = {
    inverter: { frequencyHz: 16_000, spreading: null, edgeFactor },
    auxiliary: { frequencyHz: 100_000, spreading: null, edgeFactor: 1 },
  };
  return { name, commit, notes, control };
}

const FIRMWARE: FirmwareRevision[] = [
  firmware('1.8.0', '52b9e0d1', 'Pilot series.'),
  firmware('1.9.0', 'd7610fa8', 'Field weakening.'),
  firmware('2.0.0', '0ab3c94e', 'New speed observer.'),
  firmware('2.0.1', '9e8f2716', 'Fix: start into a turning motor.'),
  firmware('2.1.0', '64dc81b5', 'First series release.'),
  firmware('2.1.1', 'f30a5d79', 'Fix: parameter set copy.'),
  firmware('2.1.2', '18c7e6b2', 'Fix: display contrast.'),
  firmware('2.2.0', 'ab52904f', 'Brake resistor model.'),
  firmware('2.2.1', '7d0196ec', 'Fix: brake model at restart.'),
  firmware('2.3.0', 'c5e43b80', 'Gate driver setting 3: lower switching losses.', 0.43),
  firmware('2.3.1', '20f7ad96', 'Fix: temperature model of the smaller heat sink.', 0.43),
  firmware('2.4.0', 'e861c35d', 'Fieldbus profile.', 0.43),
  firmware('2.4.1', '3f94b07a', 'Fix: fieldbus time-out.', 0.43),
  firmware('2.5.0', '8ba2d61c', 'Motor identification at standstill.', 0.43),
];

const HISTORY: BuildRow[] = [
  { hardware: 'M1', firmware: '1.8.0', daysAgo: 221, changes: ['pilot series'] },
  { hardware: 'M1', firmware: '1.9.0', daysAgo: 206, changes: ['field weakening'] },
  { hardware: 'M1', firmware: '2.0.0', daysAgo: 192, changes: ['speed observer'], unit: 'DR-0034' },
  { hardware: 'M2', firmware: '2.0.0', daysAgo: 183, changes: ['X capacitor moved'], runs: 2 },
  { hardware: 'M2', firmware: '2.0.1', daysAgo: 172, changes: ['flying start'] },
  {
    hardware: 'M2',
    firmware: '2.1.0',
    daysAgo: 158,
    changes: ['release'],
    runs: 3,
    background: true,
  },
  { hardware: 'M2', firmware: '2.1.1', daysAgo: 139, changes: ['parameter copy'], runs: 0 },
  { hardware: 'M2', firmware: '2.1.2', daysAgo: 131, changes: ['display'], runs: 0 },
  { hardware: 'M2', firmware: '2.2.0', daysAgo: 117, changes: ['brake model'], runs: 0 },
  { hardware: 'M2', firmware: '2.2.1', daysAgo: 104, changes: ['brake model at restart'], runs: 2, background: true },
  {
    hardware: 'M2',
    firmware: '2.3.0',
    daysAgo: 82,
    changes: ['gate driver setting 1 to 3'],
    runs: 3,
    background: true,
  },
  { hardware: 'M2', firmware: '2.3.1', daysAgo: 66, changes: ['heat sink model'], runs: 2 },
  { hardware: 'M2', firmware: '2.4.0', daysAgo: 41, changes: ['fieldbus profile'] },
  { hardware: 'M2', firmware: '2.4.1', daysAgo: 22, changes: ['fieldbus time-out'], unit: 'DR-0034' },
  { hardware: 'M2', firmware: '2.5.0', daysAgo: 6, changes: ['motor identification'], runs: 2, background: true },
];
