import { DAY_MS, type BuildRow, writeBuilds } from './scenario-builds';
import type { DemoProduct, FirmwareControl, FirmwareRevision, HardwareRevision } from './scenario-types';

const FULL_LOAD = '230 V full load';
const LOW_MAINS = '120 V full load';
const TRICKLE = '230 V trickle';

/**
 * The charger's story: firmware 4.0.0 raises the PFC from 65 to 78 kHz to shrink the ripple current. Its second harmonic moves from
 * 130 kHz, below the range of the limit, to 156 kHz, where the limit begins. The two builds after it keep the new frequency: the
 * drop is open, and the reference stays 3.6.2, the release that went to the test house.
 * Beside it: board C2 (build 9) got a second turn of wire on the choke, a small gain; two builds nobody measured.
 */
export function chargerProduct(nowMs: number): DemoProduct {
  const builds = writeBuilds(
    HISTORY,
    { states: [FULL_LOAD, LOW_MAINS, TRICKLE], unit: 'CH-0007', bench: 'bench-1', hourUtc: 7 },
    nowMs,
  );
  return {
    key: 'charger-750',
    name: 'Heronsway 750 W charger',
    description: 'Battery charger for light vehicles, boost PFC and LLC stage, digital control.',
    teamKey: 'charging',
    limitSetKey: 'CISPR32_B',
    targetMarginDb: 3,
    sharedWith: ['drives-lighting'],
    states: [
      {
        name: FULL_LOAD,
        supplyVoltageV: 230,
        supplyFrequencyHz: 50,
        load: '48 V 15.6 A, resistive',
        mode: 'constant current',
        isRequired: true,
        operation: {
          PFC: { course: { kind: 'boostPfc', mainsPeakV: 325, busV: 400 }, frequencyFactor: 1, currentFactor: 1 },
          LLC: { course: { kind: 'steady', duty: 0.492 }, frequencyFactor: 1, currentFactor: 1 },
        },
      },
      {
        name: LOW_MAINS,
        supplyVoltageV: 120,
        supplyFrequencyHz: 60,
        load: '48 V 15.6 A, resistive',
        mode: 'constant current',
        isRequired: true,
        operation: {
          PFC: { course: { kind: 'boostPfc', mainsPeakV: 170, busV: 400 }, frequencyFactor: 1, currentFactor: 1 },
          LLC: { course: { kind: 'steady', duty: 0.492 }, frequencyFactor: 1, currentFactor: 1 },
        },
      },
      {
        name: TRICKLE,
        supplyVoltageV: 230,
        supplyFrequencyHz: 50,
        load: '54 V 0.4 A',
        mode: 'trickle, pulse bundles',
        isRequired: true,
        operation: {
          PFC: { course: { kind: 'burst', duty: 0.32, onFraction: 0.3 }, frequencyFactor: 1, currentFactor: 1 },
          LLC: { course: { kind: 'burst', duty: 0.492, onFraction: 0.3 }, frequencyFactor: 1.42, currentFactor: 0.3 },
        },
      },
    ],
    units: ['CH-0007', 'CH-0011'],
    hardwareRevisions: HARDWARE,
    firmwareRevisions: FIRMWARE,
    builds,
    references: [
      {
        build: { hardware: 'C2', firmware: '3.6.2' },
        chosenAtMs: nowMs - 58 * DAY_MS,
        chosenByEmail: 'runa.fellgarth@brackenholt.example',
        reason: 'Release that went to the test house.',
      },
    ],
    dropActions: [
      {
        build: { hardware: 'C2', firmware: '4.0.0' },
        band: null,
        ownerEmail: 'ivo.brasted@brackenholt.example',
        afterDays: 4,
        becomes: 'checking',
        fixedBy: null,
        note: 'PFC now at 78 kHz. Checking whether the second harmonic at 156 kHz is all of it.',
      },
    ],
    clockSpread: { unitPercent: 0.05, sessionPercent: 0.01 },
  };
}

function control(pfcHz: number, pfcEdge = 1): Record<string, FirmwareControl> {
  return {
    PFC: { frequencyHz: pfcHz, spreading: null, edgeFactor: pfcEdge },
    LLC: { frequencyHz: 112_000, spreading: null, edgeFactor: 1 },
  };
}

const BOARD_C1: HardwareRevision = {
  name: 'C1',
  notes: 'First board with the combined mains filter.',
  filter: {
    yCapacitor: { capacitanceF: 6.6e-9, esrOhm: 0.1, eslH: 9e-9 },
    commonModeChoke: { inductanceH: 14e-3, windingCapacitanceF: 12e-12, lossOhm: 25e3 },
    converterCapacitor: { capacitanceF: 1.5e-6, esrOhm: 0.03, eslH: 14e-9 },
    differentialChoke: { inductanceH: 130e-6, windingCapacitanceF: 9e-12, lossOhm: 4e3 },
    mainsCapacitor: { capacitanceF: 1.2e-6, esrOhm: 0.03, eslH: 14e-9 },
    bypassH: 1.2e-9,
  },
  stages: [
    {
      key: 'PFC',
      swingV: 400,
      riseTimeS: 45e-9,
      fallTimeS: 38e-9,
      strayCapacitanceF: 24e-12,
      differential: {
        kind: 'inductorRipple',
        inductor: { inductanceH: 420e-6, windingCapacitanceF: 25e-12, lossOhm: 30e3 },
      },
      ringing: { frequencyHz: 17e6, quality: 6, heightDb: 9 },
    },
    {
      key: 'LLC',
      swingV: 400,
      riseTimeS: 140e-9,
      fallTimeS: 140e-9,
      strayCapacitanceF: 9e-12,
      differential: { kind: 'pulsedCurrent', amplitudeA: 0.02 },
      ringing: { frequencyHz: 9e6, quality: 4, heightDb: 4 },
    },
  ],
};

const HARDWARE: HardwareRevision[] = [
  BOARD_C1,
  {
    ...BOARD_C1,
    name: 'C2',
    notes: 'Common-mode choke with two more turns, same core.',
    filter: { ...BOARD_C1.filter, commonModeChoke: { ...BOARD_C1.filter.commonModeChoke, inductanceH: 17e-3 } },
  },
];

const FIRMWARE: FirmwareRevision[] = [
  { name: '3.0.0', commit: '4be19c02', notes: 'First release of the new control core.', control: control(65_000) },
  { name: '3.1.0', commit: '90d1f7aa', notes: 'Battery profiles of two more makers.', control: control(65_000) },
  { name: '3.2.0', commit: 'c3a8810e', notes: 'Soft start lengthened to 300 ms.', control: control(65_000) },
  { name: '3.2.1', commit: '17e2b4d9', notes: 'Fix: fan curve at low load.', control: control(65_000) },
  { name: '3.3.0', commit: '5508c1f3', notes: 'LLC start-up at higher frequency.', control: control(65_000) },
  { name: '3.4.0', commit: 'e91d03b7', notes: 'Bus voltage loop retuned.', control: control(65_000) },
  { name: '3.5.0', commit: '2a6ff084', notes: 'Logging of mains faults.', control: control(65_000) },
  { name: '3.5.1', commit: '8d40b29c', notes: 'Fix: log memory wear.', control: control(65_000) },
  { name: '3.6.0', commit: 'b7c25e16', notes: 'Charge end detection reworked.', control: control(65_000) },
  { name: '3.6.2', commit: '03f9a7d8', notes: 'Release for the test house.', control: control(65_000) },
  { name: '3.7.0', commit: '6c81e5b0', notes: 'Bootloader with rollback.', control: control(65_000) },
  { name: '3.7.1', commit: 'fa02d96e', notes: 'Fix: rollback after brown-out.', control: control(65_000) },
  { name: '4.0.0', commit: '71b6ce43', notes: 'PFC ripple current reduced.', control: control(78_000) },
  { name: '4.0.1', commit: 'd52f0981', notes: 'Fix: current sharing at start.', control: control(78_000) },
  { name: '4.1.0', commit: '38ae64f7', notes: 'Charge profile editor.', control: control(78_000) },
];

const HISTORY: BuildRow[] = [
  { hardware: 'C1', firmware: '3.0.0', daysAgo: 168, changes: ['control core'] },
  { hardware: 'C1', firmware: '3.1.0', daysAgo: 157, changes: ['battery profiles'] },
  { hardware: 'C1', firmware: '3.2.0', daysAgo: 146, changes: ['soft start 120 to 300 ms'] },
  { hardware: 'C1', firmware: '3.2.1', daysAgo: 139, changes: ['fan curve'], runs: 2 },
  { hardware: 'C1', firmware: '3.3.0', daysAgo: 128, changes: ['LLC start frequency'] },
  { hardware: 'C1', firmware: '3.4.0', daysAgo: 118, changes: ['bus voltage loop'], runs: 0 },
  { hardware: 'C1', firmware: '3.5.0', daysAgo: 109, changes: ['mains fault log'] },
  { hardware: 'C1', firmware: '3.5.1', daysAgo: 102, changes: ['log memory'] },
  { hardware: 'C2', firmware: '3.5.1', daysAgo: 90, changes: ['common-mode choke 14 to 17 mH'], runs: 2 },
  { hardware: 'C2', firmware: '3.6.0', daysAgo: 77, changes: ['charge end detection'] },
  {
    hardware: 'C2',
    firmware: '3.6.2',
    daysAgo: 64,
    changes: ['release'],
    runs: 3,
    background: true,
  },
  { hardware: 'C2', firmware: '3.7.0', daysAgo: 49, changes: ['bootloader'] },
  { hardware: 'C2', firmware: '3.7.1', daysAgo: 41, changes: ['rollback'], unit: 'CH-0011' },
  {
    hardware: 'C2',
    firmware: '4.0.0',
    daysAgo: 24,
    changes: ['PFC switching frequency 65 to 78 kHz'],
    runs: 3,
    background: true,
  },
  { hardware: 'C2', firmware: '4.0.1', daysAgo: 15, changes: ['current sharing'], runs: 0 },
  { hardware: 'C2', firmware: '4.1.0', daysAgo: 5, changes: ['charge profile editor'], runs: 3, background: true },
];
