import type { BandInput, BuildInput, SeriesInput } from '@shared/judging/build-input';
import type { RunMargin } from '@shared/judging/run-margin';

let lastSweepId = 0;

/** A sound QP run at 156 kHz to the class B line of CISPR 32, 8 dB under it. */
export function aRun(overrides: Partial<RunMargin> = {}): RunMargin {
  const sweepId = ++lastSweepId;
  const marginDb = overrides.marginDb ?? 8;
  const limitDbuv = overrides.limitDbuv ?? 65.7;
  return {
    sweepId,
    buildId: 1,
    run: `run-${sweepId}`,
    unit: '0007',
    bench: 'bench-1',
    takenAt: Date.UTC(2026, 2, 2) + sweepId * 3_600_000,
    limitLineKey: 'CISPR32_B/QP',
    rbwHz: 9_000,
    stepHz: 4_500,
    attenuationDb: 10,
    correction: 'inFile',
    gridId: 1,
    readingHash: `hash-${sweepId}`,
    frequencyHz: 156_000,
    levelDbuv: limitDbuv - marginDb,
    floorMarginDb: 40,
    coveredFraction: 1,
    backgroundLevelDbuv: 10,
    ...overrides,
    marginDb,
    limitDbuv,
  };
}

/** Runs of these margins; builds are numbered on from `firstBuildId`, one a run. */
export function runsOf(
  marginsDb: readonly number[],
  firstBuildId = 1,
  overrides: Partial<RunMargin> = {},
): RunMargin[] {
  return marginsDb.map((marginDb, index) => aRun({ marginDb, buildId: firstBuildId + index, ...overrides }));
}

/** A band compared with five quiet earlier builds at 8 dB, which are its history too. */
export function aBand(overrides: Partial<BandInput> = {}): BandInput {
  const reference = overrides.reference ?? runsOf([8.3, 7.8, 8.1, 7.6, 8.2]);
  return {
    band: '0.15-0.5 MHz',
    build: [aRun({ buildId: 100 })],
    previous: reference.slice(-1),
    history: reference,
    spread: null,
    guards: [],
    ...overrides,
    reference,
  };
}

export function aSeries(overrides: Partial<SeriesInput> = {}): SeriesInput {
  return {
    stateId: 1,
    stateName: '230 V full load',
    line: 'L',
    detector: 'QP',
    limitLineKey: 'CISPR32_B/QP',
    bands: [aBand()],
    ...overrides,
  };
}

export function aBuildInput(overrides: Partial<BuildInput> = {}): BuildInput {
  return { series: [aSeries()], thresholdDb: 2, targetMarginDb: 6, ...overrides };
}

/** A build of one band. */
export function oneBand(overrides: Partial<BandInput> = {}): BuildInput {
  return aBuildInput({ series: [aSeries({ bands: [aBand(overrides)] })] });
}
