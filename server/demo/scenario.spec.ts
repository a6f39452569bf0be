import type { Detector } from '@shared/detectors/detectors';
import { bandsFor } from '@shared/limits/bands';
import { cellEdgesHz } from '@shared/limits/cells';
import { findLimitSet, lineForDetector } from '@shared/limits/limit-sets';
import { type MarginPoint, prepareGrid, sweepMargins } from '@shared/traces/margins';
import { demoScenario } from './scenario';
import type { DemoBuild, DemoProduct, DemoScenario } from './scenario-types';
import { DEMO_RASTER, createDemoSimulator } from './simulate-session';

const NOW_MS = Date.UTC(2026, 5, 17, 10);
const DAY_MS = 86_400_000;
const frequenciesHz = Float64Array.from(
  { length: DEMO_RASTER.pointCount },
  (_, point) => DEMO_RASTER.startHz + DEMO_RASTER.stepHz * point,
);
const scenario = demoScenario(NOW_MS);
const simulator = createDemoSimulator(scenario);

function productOf(key: string, of: DemoScenario = scenario): DemoProduct {
  const product = of.products.find((entry) => entry.key === key);
  if (product === undefined) throw new Error(`no product ${key}`);
  return product;
}

function buildOf(product: DemoProduct, hardware: string, firmware: string): DemoBuild {
  const build = product.builds.find((entry) => entry.hardware === hardware && entry.firmware === firmware);
  if (build === undefined) throw new Error(`no build ${hardware} ${firmware}`);
  return build;
}

/** Worst margin of a build's first run in a band, over both lines, and where it is. */
function worst(key: string, revisions: string, state: string, detector: Detector, band: string): MarginPoint {
  const product = productOf(key);
  const [hardware, firmware] = revisions.split(' ');
  const build = buildOf(product, hardware, firmware);
  const set = findLimitSet(product.limitSetKey);
  const limit = set && lineForDetector(set, detector);
  const session = build.sessions.find((entry) => entry.kind === 'product' && entry.state === state);
  if (limit === undefined || session === undefined) throw new Error(`nothing measured of ${revisions} ${state}`);
  const grid = prepareGrid(frequenciesHz, limit, bandsFor(limit), cellEdgesHz());
  const levels = simulator.simulateLevels(product, build, session);
  const points = (['L', 'N'] as const).flatMap((line) => {
    const found = sweepMargins(levels[line][detector], grid).bands.find((entry) => entry.band === band)?.worst;
    return found ? [found] : [];
  });
  return points.reduce((least, point) => (point.marginDb < least.marginDb ? point : least));
}

const LOW = '0.15-0.5 MHz';
const HIGH = '5-30 MHz';

describe('the demo scenario', () => {
  it('has three teams, two benches, five products with 12 to 30 builds, and people of every role', () => {
    expect(scenario.teams).toHaveLength(3);
    expect(scenario.benches).toHaveLength(2);
    expect(scenario.products).toHaveLength(5);
    for (const product of scenario.products) {
      expect(product.builds.length).toBeGreaterThanOrEqual(12);
      expect(product.builds.length).toBeLessThanOrEqual(30);
    }
    expect(scenario.people.filter((person) => person.isAdministrator)).toHaveLength(1);
    for (const team of scenario.teams) {
      const roles = scenario.people.flatMap(({ memberships }) =>
        memberships.filter(({ teamKey }) => teamKey === team.key).map(({ role }) => role),
      );
      expect(new Set(roles)).toEqual(new Set(['lead', 'engineer', 'technician', 'viewer']));
    }
  });

  it('names only builds, people, states and benches that exist', () => {
    const emails = new Set(scenario.people.map((person) => person.email));
    const benches = new Set(scenario.benches.map((bench) => bench.key));
    for (const product of scenario.products) {
      for (const action of product.dropActions) {
        expect(emails).toContain(action.ownerEmail);
        buildOf(product, action.build.hardware, action.build.firmware);
        if (action.fixedBy) buildOf(product, action.fixedBy.hardware, action.fixedBy.firmware);
      }
      for (const reference of product.references) {
        expect(emails).toContain(reference.chosenByEmail);
        buildOf(product, reference.build.hardware, reference.build.firmware);
      }
      const states = new Set(product.states.map((state) => state.name));
      for (const session of product.builds.flatMap((build) => build.sessions)) {
        expect(states).toContain(session.state);
        expect(benches).toContain(session.bench);
        expect(product.units).toContain(session.unit);
      }
    }
  });

  it('ends a few days before now, with builds, runs and choices in order', () => {
    for (const product of scenario.products) {
      const times = product.builds.flatMap((build) => [build.builtAtMs, ...build.sessions.map((s) => s.takenAtMs)]);
      expect(Math.max(...times)).toBeLessThan(NOW_MS);
      expect(NOW_MS - Math.max(...times)).toBeLessThan(14 * DAY_MS);
      const builtAt = product.builds.map((build) => build.builtAtMs);
      expect(builtAt).toEqual([...builtAt].sort((a, b) => a - b));
      for (const { build, chosenAtMs } of product.references) {
        const runs = buildOf(product, build.hardware, build.firmware).sessions.map((session) => session.takenAtMs);
        expect(chosenAtMs).toBeGreaterThan(Math.max(...runs));
      }
    }
  });

  it('gives the same levels on any day', () => {
    const later = demoScenario(NOW_MS + 40 * DAY_MS);
    const levelsOn = (of: DemoScenario) => {
      const product = productOf('lamp-120', of);
      const [build] = product.builds;
      return createDemoSimulator(of).simulateLevels(product, build, build.sessions[0]).N.QP.join();
    };
    expect(levelsOn(later) === levelsOn(scenario)).toBe(true);
  });
});

// The stories are what the scenario plants; frequencies are n times the switching frequency.
describe('the planted stories', () => {
  it('moves the second harmonic of the charger PFC to 156 kHz, the new worst point', () => {
    const before = worst('charger-750', 'C2 3.6.2', '230 V full load', 'AV', LOW);
    const after = worst('charger-750', 'C2 4.0.0', '230 V full load', 'AV', LOW);
    expect(Math.abs(before.frequencyHz - 3 * 65_000)).toBeLessThan(500);
    expect(Math.abs(after.frequencyHz - 2 * 78_000)).toBeLessThan(500);
    expect(before.marginDb).toBeGreaterThan(3);
    expect(before.marginDb - after.marginDb).toBeGreaterThan(4.5);
    expect(after.marginDb).toBeLessThan(2);
  });

  it('lets the server supply creep in the low band, no step above 2 dB', () => {
    const firmwares = ['5.0.0', '5.2.1', '5.6.1', '5.8.1'];
    const margins = firmwares.map((name) => worst('server-2400', `S3 ${name}`, '230 V 100 %', 'AV', LOW).marginDb);
    expect(margins[0] - margins[3]).toBeGreaterThan(2.5);
    expect(Math.max(...margins.slice(1).map((marginDb, index) => margins[index] - marginDb))).toBeLessThan(2.2);
  });

  it('reads the server supply 10 dB high in the session with the pad entered twice', () => {
    const right = worst('server-2400', 'S3 5.6.1', '230 V 100 %', 'QP', HIGH).marginDb;
    const wrong = worst('server-2400', 'S3 5.6.0', '230 V 100 %', 'QP', HIGH).marginDb;
    expect(Math.abs(right - wrong - 10)).toBeLessThan(2.5);
  });

  it('leaves one required state of the newest server build unmeasured', () => {
    const product = productOf('server-2400');
    const measured = product.builds[product.builds.length - 1].sessions.map((session) => session.state);
    expect(product.states.map(({ name }) => name).filter((name) => !measured.includes(name))).toEqual(['230 V 10 %']);
  });

  it('raises the drive above 5 MHz by its faster edges and leaves the low band alone', () => {
    const change = (band: string): number =>
      worst('drive-1500', 'M2 2.1.0', '230 V rated speed', 'AV', band).marginDb -
      worst('drive-1500', 'M2 2.3.0', '230 V rated speed', 'AV', band).marginDb;
    expect(change(HIGH)).toBeGreaterThan(5);
    expect(Math.abs(change(LOW))).toBeLessThan(2.5);
  });

  it('makes average levels of the lamp driver jump without spreading, and brings them back with it', () => {
    const margin = (build: string, detector: Detector): number =>
      worst('lamp-120', build, '230 V full light', detector, LOW).marginDb;
    expect(margin('L4 1.5.0', 'AV') - margin('L4 1.6.0', 'AV')).toBeGreaterThan(5);
    expect(Math.abs(margin('L4 1.5.0', 'PK') - margin('L4 1.6.0', 'PK'))).toBeLessThan(2);
    expect(Math.abs(margin('L4 1.5.0', 'AV') - margin('L4 1.6.1', 'AV'))).toBeLessThan(1.5);
  });

  it('gains margin with the new choke of the adapter', () => {
    const before = worst('adapter-45', 'A2 0.7.0', '230 V 2.25 A', 'AV', LOW).marginDb;
    const after = worst('adapter-45', 'A3 0.8.1', '230 V 2.25 A', 'AV', LOW).marginDb;
    expect(after - before).toBeGreaterThan(4);
  });
});
