import type { OperatingCourse, Spreading } from '@shared/simulation/switching-stage';
import { type BuildRow, DAY_MS, type MeasuringHabit, writeBuilds } from './scenario-builds';
import type { DemoProduct, DemoState, FirmwareControl, FirmwareRevision, HardwareRevision } from './scenario-types';

const HIGH_MAINS = '230 V 2.25 A';
const LOW_MAINS = '115 V 2.25 A';
const IDLE = '230 V no load';

/**
 * The adapter's story: board A3 doubled the common-mode choke, a gain of some 6 dB in the two lower bands.
 * Beside it: with build A3 / 0.9.1 the 10 dB pad was in the cable and not entered, so everything reads 10 dB low, an apparent gain that
 * is a bench fault; two builds nobody measured.
 */
export function adapterProduct(nowMs: number): DemoProduct {
  return {
    key: 'adapter-45',
    name: 'Larkspur 45 W bench adapter',
    description: 'Table-top adapter, flyback at 65 kHz with natural jitter.',
    teamKey: 'charging',
    limitSetKey: 'CISPR32_B',
    targetMarginDb: 6,
    sharedWith: [],
    states: STATES,
    units: ['AD-0202', 'AD-0209'],
    hardwareRevisions: HARDWARE,
    firmwareRevisions: FIRMWARE,
    builds: writeBuilds(HISTORY, HABIT, nowMs),
    references: [
      {
        build: { hardware: 'A2', firmware: '0.7.0' },
        chosenAtMs: nowMs - 120 * DAY_MS,
        chosenByEmail: 'runa.fellgarth@brackenholt.example',
        reason: 'Last build of the old filter.',
      },
      {
        build: { hardware: 'A3', firmware: '1.0.0' },
        chosenAtMs: nowMs - 25 * DAY_MS,
        chosenByEmail: 'runa.fellgarth@brackenholt.example',
        reason: 'Release.',
      },
    ],
    dropActions: [],
    clockSpread: { unitPercent: 0.4, sessionPercent: 0.03 },
  };
}

/**
 * The adapter with one build more than the demo holds, for files that are imported by hand.
 *
 * @param nowMs the demo's now, UTC ms
 * @returns the product whose last build is the next one
 */
export function adapterWithNextBuild(nowMs: number): DemoProduct {
  const product = adapterProduct(nowMs);
  return {
    ...product,
    firmwareRevisions: [...product.firmwareRevisions, NEXT_FIRMWARE],
    builds: [...product.builds, ...writeBuilds([NEXT_BUILD], HABIT, nowMs)],
  };
}

const HABIT: MeasuringHabit = {
  states: [HIGH_MAINS, LOW_MAINS, IDLE],
  unit: 'AD-0202',
  bench: 'bench-2',
  hourUtc: 8,
};

function state(
  name: string,
  voltageV: number,
  load: string,
  course: OperatingCourse,
  currentFactor: number,
): DemoState {
  return {
    name,
    supplyVoltageV: voltageV,
    supplyFrequencyHz: voltageV === 230 ? 50 : 60,
    load,
    mode: 'normal',
    isRequired: true,
    operation: { flyback: { course, frequencyFactor: 1, currentFactor } },
  };
}

const STATES: DemoState[] = [
  state(HIGH_MAINS, 230, '20 V 2.25 A', { kind: 'steady', duty: 0.24 }, 0.8),
  state(LOW_MAINS, 115, '20 V 2.25 A', { kind: 'steady', duty: 0.41 }, 1),
  state(IDLE, 230, 'none', { kind: 'burst', duty: 0.1, onFraction: 0.06 }, 0.35),
];

const BOARD_A1: HardwareRevision = {
  name: 'A1',
  notes: 'First samples.',
  filter: {
    yCapacitor: { capacitanceF: 1e-9, esrOhm: 0.15, eslH: 8e-9 },
    commonModeChoke: { inductanceH: 14e-3, windingCapacitanceF: 11e-12, lossOhm: 35e3 },
    converterCapacitor: { capacitanceF: 82e-6, esrOhm: 0.05, eslH: 18e-9 },
    differentialChoke: { inductanceH: 160e-6, windingCapacitanceF: 12e-12, lossOhm: 6e3 },
    mainsCapacitor: { capacitanceF: 0.22e-6, esrOhm: 0.05, eslH: 12e-9 },
    bypassH: 0.2e-9,
  },
  stages: [
    {
      key: 'flyback',
      swingV: 430,
      riseTimeS: 70e-9,
      fallTimeS: 45e-9,
      strayCapacitanceF: 4e-12,
      differential: { kind: 'pulsedCurrent', amplitudeA: 1.5 },
      ringing: { frequencyHz: 14e6, quality: 8, heightDb: 8 },
    },
  ],
};

const HARDWARE: HardwareRevision[] = [
  BOARD_A1,
  {
    ...BOARD_A1,
    name: 'A2',
    notes: 'Clamp with a slower diode: less ringing.',
    stages: [{ ...BOARD_A1.stages[0], ringing: { frequencyHz: 13.2e6, quality: 6, heightDb: 5 } }],
  },
  {
    ...BOARD_A1,
    name: 'A3',
    notes: 'Common-mode choke 14 to 28 mH in two chambers.',
    filter: {
      ...BOARD_A1.filter,
      commonModeChoke: { inductanceH: 28e-3, windingCapacitanceF: 8e-12, lossOhm: 60e3 },
      differentialChoke: { inductanceH: 300e-6, windingCapacitanceF: 12e-12, lossOhm: 9e3 },
    },
    stages: [{ ...BOARD_A1.stages[0], ringing: { frequencyHz: 13.2e6, quality: 6, heightDb: 5 } }],
  },
];

const JITTER: Spreading = { peakToPeakPercent: 6, modulationHz: 400, profile: 'triangle' };

function firmware(name: string, commit: string, notes: string, frequencyHz = 65_000): FirmwareRevision {
  const control: Record<string, FirmwareControl> = {
    flyback: { frequencyHz, spreading: JITTER, edgeFactor: 1 },
  };
  return { name, commit, notes, control };
}

/** The build a newcomer imports by hand: the flyback at 79 kHz brings its second harmonic from 130 to 158 kHz. */
const NEXT_FIRMWARE = firmware('1.1.0', 'd6b80f23', 'Flyback 65 to 79 kHz for a smaller transformer.', 79_000);
const NEXT_BUILD: BuildRow = {
  hardware: 'A3',
  firmware: NEXT_FIRMWARE.name,
  daysAgo: 3,
  changes: ['flyback 65 to 79 kHz'],
  runs: 2,
  background: true,
};

const FIRMWARE: FirmwareRevision[] = [
  firmware('0.4.0', 'a27f05e9', 'First samples.'),
  firmware('0.5.0', '6ec31d48', 'Output profiles.'),
  firmware('0.5.1', 'd90b7fa2', 'Fix: profile after unplugging.'),
  firmware('0.6.0', '14a8c65b', 'Cable drop compensation.'),
  firmware('0.7.0', 'f7e2093d', 'Over-temperature restart.'),
  firmware('0.8.0', '5b96d1c4', 'Identification of the cable.'),
  firmware('0.8.1', '83c04ea7', 'Fix: identification at 5 V.'),
  firmware('0.9.0', 'ce5f7a10', 'Pilot series.'),
  firmware('0.9.1', '29d1b68f', 'Fix: restart after short circuit.'),
  firmware('1.0.0', 'b0473ec5', 'Release.'),
  firmware('1.0.1', '7f8ad236', 'Fix: indicator lamp.'),
];

const HISTORY: BuildRow[] = [
  { hardware: 'A1', firmware: '0.4.0', daysAgo: 188, changes: ['first samples'] },
  { hardware: 'A1', firmware: '0.5.0', daysAgo: 176, changes: ['output profiles'], runs: 2 },
  { hardware: 'A1', firmware: '0.5.1', daysAgo: 169, changes: ['profile after unplugging'] },
  { hardware: 'A2', firmware: '0.5.1', daysAgo: 158, changes: ['clamp diode'] },
  { hardware: 'A2', firmware: '0.6.0', daysAgo: 146, changes: ['cable drop'] },
  { hardware: 'A2', firmware: '0.7.0', daysAgo: 129, changes: ['restart'], runs: 3, background: true },
  { hardware: 'A2', firmware: '0.8.0', daysAgo: 113, changes: ['cable identification'], runs: 0 },
  { hardware: 'A2', firmware: '0.8.1', daysAgo: 101, changes: ['identification at 5 V'] },
  {
    hardware: 'A3',
    firmware: '0.8.1',
    daysAgo: 84,
    changes: ['common-mode choke 14 to 28 mH'],
    runs: 3,
    background: true,
  },
  { hardware: 'A3', firmware: '0.9.0', daysAgo: 67, changes: ['pilot series'], unit: 'AD-0209' },
  {
    hardware: 'A3',
    firmware: '0.9.1',
    daysAgo: 46,
    changes: ['restart after short circuit'],
    padMistake: { padDb: 10, enteredPadDb: 0 },
  },
  { hardware: 'A3', firmware: '1.0.0', daysAgo: 29, changes: ['release'], runs: 2, background: true },
  { hardware: 'A3', firmware: '1.0.1', daysAgo: 10, changes: ['indicator lamp'] },
];
