import { SweepTags } from '@shared/contracts/sweeps';
import { readDelimited } from '@shared/traces/read-delimited';
import { demoScenario } from './scenario';
import { simulateDemoFiles } from './simulate-demo-files';
import { DEMO_RASTER, createDemoSimulator } from './simulate-session';

const NOW_MS = Date.UTC(2026, 5, 17, 10);
const files = simulateDemoFiles(NOW_MS);

describe('simulateDemoFiles', () => {
  it('writes files the import reads, one set of valid tags a trace', () => {
    const readable = files.filter((file) => file.tags.length > 0);
    expect(readable.length).toBeGreaterThanOrEqual(8);
    for (const { bytes, tags } of readable) {
      const reading = readDelimited(bytes, {});
      expect(reading.frequenciesHz).toHaveLength(DEMO_RASTER.pointCount);
      expect(reading.frequenciesHz[DEMO_RASTER.pointCount - 1]).toBe(29_998_500);
      expect(reading.settings.rbwHz).toBe(9000);
      expect(reading.traces.map(({ line, detector }) => ({ line, detector }))).toEqual(
        tags.map(({ line, detector }) => ({ line, detector })),
      );
      for (const tag of tags) SweepTags.parse(tag);
    }
  });

  it('has single traces, several traces in one file, decimal commas, a background and a fault', () => {
    const readings = files.filter((file) => file.tags.length > 0).map((file) => readDelimited(file.bytes, {}));
    expect(readings.filter((reading) => reading.traces.length === 1)).toHaveLength(4);
    expect(readings.filter((reading) => reading.delimiter === ';' && reading.decimalMark === ',')).toHaveLength(1);
    expect(files.filter((file) => file.tags[0]?.kind === 'background')).toHaveLength(1);
    const broken = files.filter((file) => file.tags.length === 0);
    expect(broken).toHaveLength(1);
    expect(() => readDelimited(broken[0].bytes, {})).toThrow(/overload/);
  });

  it('names a build that the demo does not hold yet', () => {
    const [tag] = files[0].tags;
    const builds = demoScenario(NOW_MS).products.find((product) => product.key === tag.product)?.builds ?? [];
    expect(builds.some((build) => build.hardware === tag.hardware)).toBe(true);
    expect(builds.some((build) => build.firmware === tag.firmware)).toBe(false);
  });
});

describe('createDemoSimulator', () => {
  it('writes the levels it simulated and repeats a file byte for byte', () => {
    const scenario = demoScenario(NOW_MS);
    const [product] = scenario.products;
    const [build] = product.builds;
    const [session] = build.sessions;
    const simulator = createDemoSimulator(scenario);
    const file = simulator.simulateSession(product, build, session);
    const levels = simulator.simulateLevels(product, build, session);
    const { traces } = readDelimited(file.bytes, {});
    expect(traces).toHaveLength(6);
    expect(traces[2].levelsDbuv.join() === levels.L.AV.join()).toBe(true);
    const again = createDemoSimulator(scenario).simulateSession(product, build, session);
    expect(Buffer.compare(again.bytes, file.bytes)).toBe(0);
  });
});
