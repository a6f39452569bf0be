import type { Spreading } from '@shared/simulation/switching-stage';
import { type BuildRow, DAY_MS, writeBuilds } from './scenario-builds';
import type { DemoProduct, DemoState, FirmwareControl, FirmwareRevision, HardwareRevision } from './scenario-types';

const FULL_LIGHT = '230 V full light';
const DIMMED = '230 V dimmed 20 %';

/**
 * The lamp driver's story: firmware 1.6.0 left frequency spreading off after a change of the start-up code. Average levels jump by
 * up to 12 dB, peak levels hardly move. Firmware 1.6.1 switches it on again: the drop is fixed, and 1.6.1 shows it.
 */
export function lampProduct(nowMs: number): DemoProduct {
  return {
    key: 'lamp-120',
    name: 'Firefold 120 W lamp driver',
    description: 'Single-stage driver for street lamps with power factor correction and frequency spreading.',
    teamKey: 'drives-lighting',
    limitSetKey: 'CISPR32_B',
    targetMarginDb: 3,
    sharedWith: ['charging'],
    states: STATES,
    units: ['LD-0420'],
    hardwareRevisions: HARDWARE,
    firmwareRevisions: FIRMWARE,
    builds: writeBuilds(
      HISTORY,
      { states: [FULL_LIGHT, DIMMED], unit: 'LD-0420', bench: 'bench-1', hourUtc: 3 },
      nowMs,
    ),
    references: [
      {
        build: { hardware: 'L4', firmware: '1.5.0' },
        chosenAtMs: nowMs - 88 * DAY_MS,
        chosenByEmail: 'hanae.morwick@brackenholt.example',
        reason: 'Build delivered to the first town.',
      },
    ],
    dropActions: [
      {
        build: { hardware: 'L4', firmware: '1.6.0' },
        band: null,
        ownerEmail: 'edric.salloway@brackenholt.example',
        afterDays: 3,
        becomes: 'causeKnown',
        fixedBy: null,
        note: 'Spreading was not started after the new start-up code; lines are sharp again.',
      },
      {
        build: { hardware: 'L4', firmware: '1.6.0' },
        band: null,
        ownerEmail: 'edric.salloway@brackenholt.example',
        afterDays: 18,
        becomes: 'fixed',
        fixedBy: { hardware: 'L4', firmware: '1.6.1' },
        note: 'Spreading started before the first pulse; measured again with 1.6.1.',
      },
    ],
    clockSpread: { unitPercent: 0.3, sessionPercent: 0.02 },
  };
}

const STATES: DemoState[] = [
  {
    name: FULL_LIGHT,
    supplyVoltageV: 230,
    supplyFrequencyHz: 50,
    load: '84 V 1.4 A, lamp module',
    mode: 'full light',
    isRequired: true,
    operation: {
      flyback: { course: { kind: 'rectifiedMains', duty: 0.34 }, frequencyFactor: 1, currentFactor: 1 },
    },
  },
  {
    name: DIMMED,
    supplyVoltageV: 230,
    supplyFrequencyHz: 50,
    load: '80 V 0.28 A, lamp module',
    mode: 'dimmed to 20 %',
    isRequired: true,
    operation: {
      flyback: { course: { kind: 'rectifiedMains', duty: 0.16 }, frequencyFactor: 1, currentFactor: 0.45 },
    },
  },
];

const BOARD_L3: HardwareRevision = {
  name: 'L3',
  notes: 'Board for the aluminium housing.',
  filter: {
    yCapacitor: { capacitanceF: 4.4e-9, esrOhm: 0.1, eslH: 9e-9 },
    commonModeChoke: { inductanceH: 18e-3, windingCapacitanceF: 14e-12, lossOhm: 30e3 },
    converterCapacitor: { capacitanceF: 0.33e-6, esrOhm: 0.05, eslH: 13e-9 },
    differentialChoke: { inductanceH: 450e-6, windingCapacitanceF: 14e-12, lossOhm: 8e3 },
    mainsCapacitor: { capacitanceF: 0.22e-6, esrOhm: 0.05, eslH: 13e-9 },
    bypassH: 0.8e-9,
  },
  stages: [
    {
      key: 'flyback',
      swingV: 520,
      riseTimeS: 55e-9,
      fallTimeS: 40e-9,
      strayCapacitanceF: 13e-12,
      differential: { kind: 'pulsedCurrent', amplitudeA: 0.75 },
      ringing: { frequencyHz: 12.5e6, quality: 7, heightDb: 9 },
    },
  ],
};

const HARDWARE: HardwareRevision[] = [
  BOARD_L3,
  {
    ...BOARD_L3,
    name: 'L4',
    notes: 'Snubber capacitor 47 to 68 pF: lower and slower ringing.',
    stages: [{ ...BOARD_L3.stages[0], ringing: { frequencyHz: 10.8e6, quality: 5, heightDb: 6 } }],
  },
];

const SPREADING: Spreading = { peakToPeakPercent: 10, modulationHz: 700, profile: 'triangle' };

function firmware(
  name: string,
  commit: string,
  notes: string,
  spreading: Spreading | null = SPREADING,
): FirmwareRevision {
  const control: Record<string, FirmwareControl> = { flyback: { frequencyHz: 118_000, spreading, edgeFactor: 1 } };
  return { name, commit, notes, control };
}

const FIRMWARE: FirmwareRevision[] = [
  firmware('1.0.0', '91e6b3c0', 'First release.'),
  firmware('1.1.0', '3d70fa28', 'Dimming curve after the sensor.'),
  firmware('1.1.1', 'b84c1095', 'Fix: flicker at 5 %.'),
  firmware('1.2.0', '05ea67df', 'Constant light output over life.'),
  firmware('1.3.0', 'f12d8c46', 'Temperature derating.'),
  firmware('1.4.0', '6973b0ae', 'Operating hours.'),
  firmware('1.4.1', 'c0458fe1', 'Fix: hours after a brown-out.'),
  firmware('1.5.0', '28bd93f7', 'Delivered to the first town.'),
  firmware('1.5.1', 'ed5106ca', 'Fix: late start in the cold.'),
  firmware('1.6.0', '7a3c2fb9', 'Start-up code rewritten.', null),
  firmware('1.6.1', '40d8e51b', 'Fix: spreading started before the first pulse.'),
  firmware('1.7.0', '9bc60a72', 'Radio module on the same board bus.'),
];

const HISTORY: BuildRow[] = [
  { hardware: 'L3', firmware: '1.0.0', daysAgo: 196, changes: ['first release'] },
  { hardware: 'L3', firmware: '1.1.0', daysAgo: 184, changes: ['dimming curve'] },
  { hardware: 'L3', firmware: '1.1.1', daysAgo: 175, changes: ['flicker'] },
  { hardware: 'L3', firmware: '1.2.0', daysAgo: 163, changes: ['constant light output'], runs: 2 },
  { hardware: 'L3', firmware: '1.3.0', daysAgo: 150, changes: ['temperature derating'], runs: 0 },
  { hardware: 'L4', firmware: '1.3.0', daysAgo: 138, changes: ['snubber 47 to 68 pF'], runs: 2, background: true },
  { hardware: 'L4', firmware: '1.4.0', daysAgo: 124, changes: ['operating hours'] },
  { hardware: 'L4', firmware: '1.4.1', daysAgo: 112, changes: ['hours after brown-out'] },
  {
    hardware: 'L4',
    firmware: '1.5.0',
    daysAgo: 95,
    changes: ['release'],
    runs: 3,
    background: true,
  },
  { hardware: 'L4', firmware: '1.5.1', daysAgo: 78, changes: ['cold start'] },
  {
    hardware: 'L4',
    firmware: '1.6.0',
    daysAgo: 55,
    changes: ['start-up code'],
    runs: 3,
    background: true,
  },
  { hardware: 'L4', firmware: '1.6.1', daysAgo: 40, changes: ['spreading before first pulse'], runs: 2 },
  { hardware: 'L4', firmware: '1.7.0', daysAgo: 8, changes: ['radio module'], background: true },
];
