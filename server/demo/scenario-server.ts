import type { OperatingCourse } from '@shared/simulation/switching-stage';
import { type BuildRow, DAY_MS, writeBuilds } from './scenario-builds';
import type { DemoProduct, DemoState, FirmwareControl, FirmwareRevision, HardwareRevision } from './scenario-types';

const FULL_LOAD = '230 V 100 %';
const HALF_LOAD = '230 V 50 %';
const LIGHT_LOAD = '230 V 10 %';

/**
 * The server supply's story: the X capacitors of each new lot hold a little less, 27 % in all over fifteen builds. No build loses
 * enough by itself, yet the low band creeps up by some 4 dB, until the newest build is flagged against the reference.
 * Beside it: at build 5.6.0 the loss of the 10 dB pad was entered twice, so everything reads 10 dB high, the floor too: a bench
 * fault, measured again two weeks later with 5.6.1; the newest build has not been measured at 10 % load; board
 * S3 brought a better winding of the LLC transformer (a gain at 180 kHz).
 */
export function serverProduct(nowMs: number): DemoProduct {
  return {
    key: 'server-2400',
    name: 'Granary 2.4 kW server supply',
    description: 'Hot-plug supply, boost PFC and LLC stage, digital control.',
    teamKey: 'server-power',
    limitSetKey: 'CISPR32_A',
    targetMarginDb: 6,
    sharedWith: [],
    states: STATES,
    units: ['SV-0102', 'SV-0115'],
    hardwareRevisions: HARDWARE,
    firmwareRevisions: FIRMWARE,
    builds: writeBuilds(
      HISTORY,
      { states: [FULL_LOAD, HALF_LOAD, LIGHT_LOAD], unit: 'SV-0102', bench: 'bench-1', hourUtc: 14 },
      nowMs,
    ),
    references: [
      {
        build: { hardware: 'S3', firmware: '5.0.0' },
        chosenAtMs: nowMs - 190 * DAY_MS,
        chosenByEmail: 'delphine.arkwold@brackenholt.example',
        reason: 'Build of the qualification report.',
      },
    ],
    dropActions: [],
    clockSpread: { unitPercent: 0.02, sessionPercent: 0.005 },
  };
}

function state(
  load: string,
  name: string,
  pfc: OperatingCourse,
  llc: { frequencyFactor: number; currentFactor: number; duty?: number },
): DemoState {
  return {
    name,
    supplyVoltageV: 230,
    supplyFrequencyHz: 50,
    load,
    mode: 'stand-alone',
    isRequired: true,
    operation: {
      PFC: { course: pfc, frequencyFactor: 1, currentFactor: 1 },
      LLC: { course: { kind: 'steady', duty: 0.494 }, ...llc },
    },
  };
}

const PFC_COURSE: OperatingCourse = { kind: 'boostPfc', mainsPeakV: 325, busV: 410 };

const STATES: DemoState[] = [
  state('12 V 200 A', FULL_LOAD, PFC_COURSE, { frequencyFactor: 1, currentFactor: 1 }),
  state('12 V 100 A', HALF_LOAD, PFC_COURSE, { frequencyFactor: 1.06, currentFactor: 0.55 }),
  state(
    '12 V 20 A',
    LIGHT_LOAD,
    { kind: 'burst', duty: 0.3, onFraction: 0.6 },
    { frequencyFactor: 1.17, currentFactor: 0.2 },
  ),
];

const BOARD_S2: HardwareRevision = {
  name: 'S2',
  notes: 'Second board, wider heat sink.',
  filter: {
    yCapacitor: { capacitanceF: 9.4e-9, esrOhm: 0.08, eslH: 7e-9 },
    commonModeChoke: { inductanceH: 6e-3, windingCapacitanceF: 16e-12, lossOhm: 14e3 },
    converterCapacitor: { capacitanceF: 1.5e-6, esrOhm: 0.02, eslH: 16e-9 },
    differentialChoke: { inductanceH: 56e-6, windingCapacitanceF: 11e-12, lossOhm: 2500 },
    mainsCapacitor: { capacitanceF: 1e-6, esrOhm: 0.02, eslH: 16e-9 },
    bypassH: 1.5e-9,
  },
  stages: [
    {
      key: 'PFC',
      swingV: 410,
      riseTimeS: 28e-9,
      fallTimeS: 24e-9,
      strayCapacitanceF: 26e-12,
      differential: {
        kind: 'inductorRipple',
        inductor: { inductanceH: 230e-6, windingCapacitanceF: 40e-12, lossOhm: 20e3 },
      },
      ringing: { frequencyHz: 21e6, quality: 5, heightDb: 7 },
    },
    {
      key: 'LLC',
      swingV: 410,
      riseTimeS: 90e-9,
      fallTimeS: 90e-9,
      strayCapacitanceF: 12e-12,
      differential: { kind: 'pulsedCurrent', amplitudeA: 0.05 },
      ringing: { frequencyHz: 11e6, quality: 5, heightDb: 5 },
    },
  ],
};

const HARDWARE: HardwareRevision[] = [
  BOARD_S2,
  {
    ...BOARD_S2,
    name: 'S3',
    notes: 'LLC transformer with a second screen, 12 to 7 pF to earth.',
    stages: [BOARD_S2.stages[0], { ...BOARD_S2.stages[1], strayCapacitanceF: 7e-12 }],
  },
];

const CONTROL: Record<string, FirmwareControl> = {
  PFC: { frequencyHz: 70_000, spreading: null, edgeFactor: 1 },
  LLC: { frequencyHz: 182_000, spreading: null, edgeFactor: 1 },
};

function firmware(name: string, commit: string, notes: string): FirmwareRevision {
  return { name, commit, notes, control: CONTROL };
}

const FIRMWARE: FirmwareRevision[] = [
  firmware('4.6.0', '1f3cb02e', 'Current sharing over the bus.'),
  firmware('4.7.0', 'a94d77c1', 'Black box of the last ten faults.'),
  firmware('4.8.0', '6b0e25f8', 'Fan control by inlet temperature.'),
  firmware('4.8.1', '0cd9318b', 'Fix: fan stop at standby.'),
  firmware('4.9.0', 'e2765a40', 'Telemetry at 10 readings a second.'),
  firmware('5.0.0', '8f21b6d3', 'Release of the qualification report.'),
  firmware('5.0.1', '47ac90e5', 'Fix: serial number readout.'),
  firmware('5.1.0', 'b06f3d12', 'Hold-up time extended.'),
  firmware('5.1.1', '5ed84a97', 'Fix: hold-up at low mains.'),
  firmware('5.2.0', '93c07ef4', 'Update over the management bus.'),
  firmware('5.2.1', '2b5a16d8', 'Fix: update after a reset.'),
  firmware('5.3.0', 'dc48e701', 'Sequence of several supplies.'),
  firmware('5.4.0', '70f9b2ac', 'Energy counter.'),
  firmware('5.4.1', '1892dd6f', 'Fix: counter overflow.'),
  firmware('5.5.0', 'c67b04e3', 'Input power limit.'),
  firmware('5.6.0', '3ad15f92', 'Cold redundancy.'),
  firmware('5.6.1', 'f458c07b', 'Fix: wake from redundancy.'),
  firmware('5.7.0', '0e93ab64', 'Signed updates.'),
  firmware('5.8.0', '862df1ca', 'Predicted fan life.'),
  firmware('5.8.1', 'b91e740d', 'Fix: fan life after service.'),
];

/** Capacitance of a lot over its nominal value, by months since the supplier changed his film. */
function lot(capacitance: number): BuildRow['lot'] {
  return { capacitance };
}

const HISTORY: BuildRow[] = [
  { hardware: 'S2', firmware: '4.6.0', daysAgo: 262, changes: ['current sharing'], lot: lot(1) },
  { hardware: 'S2', firmware: '4.7.0', daysAgo: 250, changes: ['fault log'], lot: lot(1.01) },
  { hardware: 'S2', firmware: '4.8.0', daysAgo: 239, changes: ['fan control'], lot: lot(0.99) },
  { hardware: 'S2', firmware: '4.8.1', daysAgo: 232, changes: ['fan at standby'], lot: lot(1), runs: 2 },
  { hardware: 'S2', firmware: '4.9.0', daysAgo: 221, changes: ['telemetry'], lot: lot(1) },
  {
    hardware: 'S3',
    firmware: '5.0.0',
    daysAgo: 205,
    changes: ['LLC transformer with second screen', 'release'],
    lot: lot(1),
    runs: 3,
    background: true,
  },
  { hardware: 'S3', firmware: '5.0.1', daysAgo: 192, changes: ['serial number'], lot: lot(0.99) },
  { hardware: 'S3', firmware: '5.1.0', daysAgo: 180, changes: ['hold-up', 'X capacitor lot 2611'], lot: lot(0.97) },
  { hardware: 'S3', firmware: '5.1.1', daysAgo: 169, changes: ['hold-up at low mains'], lot: lot(0.955) },
  { hardware: 'S3', firmware: '5.2.0', daysAgo: 157, changes: ['update', 'X capacitor lot 2615'], lot: lot(0.935) },
  { hardware: 'S3', firmware: '5.2.1', daysAgo: 148, changes: ['update after reset'], lot: lot(0.92), runs: 2 },
  { hardware: 'S3', firmware: '5.3.0', daysAgo: 136, changes: ['sequence', 'X capacitor lot 2619'], lot: lot(0.9) },
  { hardware: 'S3', firmware: '5.4.0', daysAgo: 121, changes: ['energy counter'], lot: lot(0.885) },
  { hardware: 'S3', firmware: '5.4.1', daysAgo: 110, changes: ['counter overflow'], lot: lot(0.87) },
  { hardware: 'S3', firmware: '5.5.0', daysAgo: 97, changes: ['power limit', 'X capacitor lot 2624'], lot: lot(0.86) },
  {
    hardware: 'S3',
    firmware: '5.6.0',
    daysAgo: 83,
    changes: ['cold redundancy'],
    lot: lot(0.85),
    padMistake: { padDb: 10, enteredPadDb: 20 },
  },
  { hardware: 'S3', firmware: '5.6.1', daysAgo: 69, changes: ['wake'], lot: lot(0.84), background: true },
  { hardware: 'S3', firmware: '5.7.0', daysAgo: 52, changes: ['signed updates'], lot: lot(0.81) },
  { hardware: 'S3', firmware: '5.8.0', daysAgo: 33, changes: ['fan life', 'X capacitor lot 2631'], lot: lot(0.77) },
  {
    hardware: 'S3',
    firmware: '5.8.1',
    daysAgo: 5,
    changes: ['fan life after service'],
    lot: lot(0.73),
    runs: 2,
    states: [FULL_LOAD, HALF_LOAD],
    background: true,
  },
];
