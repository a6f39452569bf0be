import type { SweepTagsInput } from '@shared/contracts/sweeps';
import { ambientSpectra } from '@shared/simulation/ambient-carriers';
import {
  type EmissionSpectrum,
  type FrequencyRaster,
  emissionSpectrum,
  emptySpectra,
} from '@shared/simulation/emission-spectrum';
import { createRandom, seedFromText } from '@shared/simulation/random-generator';
import {
  type MeasuringSession,
  type SweepSet,
  drawSession,
  simulateSweepSet,
} from '@shared/simulation/simulate-sweep-set';
import { createSpreadShapes } from '@shared/simulation/spread-shapes';
import type { DemoBench, DemoBuild, DemoProduct, DemoScenario, DemoSession } from './scenario-types';
import { conditionOf, firmwareOf } from './simulate-condition';
import { type FileLayout, fileText } from './simulate-file-text';

/** 150 kHz to 30 MHz in steps of half the receiver's bandwidth. Source: CISPR 16-2-1, step at most RBW / 2. */
export const DEMO_RASTER: FrequencyRaster = { startHz: 150_000, stepHz: 4500, pointCount: 6634 };

const DWELL_S = 0.1;
const RBW_HZ = 9000;
/** Night and weather move distant transmitters by some dB; invented. */
const AMBIENT_FADING_DB = 2;

/** A sweep file of the demo with the tags of each of its traces. */
export interface DemoFile {
  fileName: string;
  bytes: Uint8Array;
  tags: SweepTagsInput[];
}

/** Takes runs of the scenario's products; the same run always gives the same bytes. */
export interface DemoSimulator {
  simulateLevels(product: DemoProduct, build: DemoBuild, session: DemoSession): SweepSet;
  simulateSession(product: DemoProduct, build: DemoBuild, session: DemoSession, layout?: FileLayout): DemoFile;
}

/**
 * Makes a simulator that computes each converter condition only once.
 *
 * @param scenario names the benches
 * @returns the simulator
 */
export function createDemoSimulator(scenario: DemoScenario): DemoSimulator {
  const shapes = createSpreadShapes();
  const spectra = new Map<string, EmissionSpectrum>();
  const silence: EmissionSpectrum = { L: emptySpectra(DEMO_RASTER), N: emptySpectra(DEMO_RASTER) };

  function spectrumOf(product: DemoProduct, build: DemoBuild, session: DemoSession): EmissionSpectrum {
    if (session.kind === 'background') return silence;
    const condition = conditionOf(product, build, session);
    const key = JSON.stringify(condition);
    let spectrum = spectra.get(key);
    if (spectrum === undefined) {
      spectrum = emissionSpectrum(condition, DEMO_RASTER, shapes);
      spectra.set(key, spectrum);
    }
    return spectrum;
  }

  function simulateLevels(product: DemoProduct, build: DemoBuild, session: DemoSession): SweepSet {
    const setUp = `${product.key} ${build.hardware} ${build.firmware} ${session.setUp}`;
    const measuring = drawMeasuring(benchOf(scenario, session.bench), session, setUp);
    const random = createRandom(seedFromText(`run ${setUp} ${session.kind} ${session.state}`));
    return simulateSweepSet(spectrumOf(product, build, session), measuring, DEMO_RASTER, random);
  }

  return {
    simulateLevels,
    simulateSession: (product, build, session, layout) => {
      const levels = simulateLevels(product, build, session);
      const bench = benchOf(scenario, session.bench);
      const traces = session.lines.flatMap((line) => session.detectors.map((detector) => ({ line, detector })));
      return {
        fileName: fileNameOf(product, build, session),
        bytes: fileText(
          preambleOf(product, build, session, bench),
          DEMO_RASTER,
          traces.map(({ line, detector }) => ({
            heading: `${line} ${detector} (dBuV)`,
            levelsDbuv: levels[line][detector],
          })),
          layout,
        ),
        tags: traces.map(({ line, detector }, index) => ({
          ...commonTags(product, build, session),
          line,
          detector,
          trace: index + 1,
        })),
      };
    },
  };
}

function drawMeasuring(bench: DemoBench, session: DemoSession, setUp: string): MeasuringSession {
  const random = createRandom(seedFromText(`set-up ${setUp}`));
  const pad = session.padMistake ?? { padDb: bench.padDb, enteredPadDb: bench.padDb };
  const { noiseFigureDb, attenuationDb } = bench;
  const carriers = bench.ambient.map((carrier) => ({
    ...carrier,
    levelDbuv: carrier.levelDbuv + AMBIENT_FADING_DB * random.nextNormal(),
  }));
  const chain = { noiseFigureDb, attenuationDb, ...pad, dwellS: DWELL_S };
  return drawSession(chain, ambientSpectra(carriers, DEMO_RASTER), DEMO_RASTER, random);
}

function benchOf(scenario: DemoScenario, key: string): DemoBench {
  const bench = scenario.benches.find((entry) => entry.key === key);
  if (bench === undefined) {
    throw new RangeError(`bench "${key}" is not part of the scenario`);
  }
  return bench;
}

/** Switching frequencies of a build as its firmware states them. */
export function switchingOf(
  product: DemoProduct,
  build: { firmware: string },
): NonNullable<SweepTagsInput['switching']> {
  return Object.entries(firmwareOf(product, build).control).map(([stage, control]) => ({
    stage,
    frequencyHz: control.frequencyHz,
    spreadPercent: control.spreading?.peakToPeakPercent ?? 0,
  }));
}

function commonTags(
  product: DemoProduct,
  build: DemoBuild,
  session: DemoSession,
): Omit<SweepTagsInput, 'line' | 'detector'> {
  return {
    product: product.key,
    hardware: build.hardware,
    firmware: build.firmware,
    unit: session.unit,
    state: session.state,
    bench: session.bench,
    kind: session.kind,
    takenAt: new Date(session.takenAtMs).toISOString(),
    rbwHz: RBW_HZ,
    run: session.run,
    corrected: true,
    switching: switchingOf(product, build),
  };
}

/** The lines an instrument writes above its table; read by people and, where they are plain settings, by the import. */
function preambleOf(
  product: DemoProduct,
  build: DemoBuild,
  session: DemoSession,
  bench: DemoBench,
): [string, string][] {
  return [
    ['Conducted emission', session.kind === 'background' ? 'device off' : product.name],
    ['Build', `${build.hardware} / ${build.firmware}`],
    ['State', session.state],
    ['Time', new Date(session.takenAtMs).toISOString()],
    ['Receiver', bench.receiver],
    ['LISN', bench.lisn],
    ['RBW', `${RBW_HZ} Hz`],
    ['Dwell', `${DWELL_S * 1000} ms`],
    ['Attenuation', `${bench.attenuationDb} dB`],
  ];
}

function fileNameOf(product: DemoProduct, build: DemoBuild, session: DemoSession): string {
  const state = session.kind === 'background' ? 'background' : session.state;
  const parts = [product.key, build.hardware, build.firmware, state, session.run];
  return `${parts.map((part) => part.toLowerCase().replace(/[^a-z0-9.]+/g, '-')).join('_')}.csv`;
}
