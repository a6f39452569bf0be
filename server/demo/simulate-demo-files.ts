import { demoScenario } from './scenario';
import { adapterWithNextBuild } from './scenario-adapter';
import type { DemoSession } from './scenario-types';
import { type DemoFile, createDemoSimulator } from './simulate-session';

/** A file to be written, with the tags to give when it is imported; no tags where the import must refuse it. */
export type ImportableFile = Pick<DemoFile, 'fileName' | 'bytes' | 'tags'> & { about: string };

/**
 * Files a newcomer imports by hand: the next build of the demo's bench adapter, with a real drop in it.
 *
 * Single traces, all traces in one file, a semicolon file with decimal commas, a sweep with the device off and a file with a fault.
 *
 * @param nowMs the demo's now, UTC ms
 * @returns the files, the ones with the drop first
 */
export function simulateDemoFiles(nowMs: number): ImportableFile[] {
  const product = adapterWithNextBuild(nowMs);
  const build = product.builds[product.builds.length - 1];
  const simulator = createDemoSimulator(demoScenario(nowMs));
  const [highMains, lowMains, idle] = product.states.map((state) => state.name);
  const find = (wanted: Pick<DemoSession, 'kind' | 'state' | 'setUp'>): DemoSession => {
    const session = build.sessions.find(
      (entry) => entry.kind === wanted.kind && entry.state === wanted.state && entry.setUp === wanted.setUp,
    );
    if (session === undefined) throw new RangeError(`the next build has no run of "${wanted.state}"`);
    return session;
  };
  const write = (session: DemoSession): DemoFile => simulator.simulateSession(product, build, session);
  const first = find({ kind: 'product', state: highMains, setUp: 0 });
  const singles = first.lines.flatMap((line) =>
    (['QP', 'AV'] as const).map((detector) =>
      renamed(
        write({ ...first, lines: [line], detectors: [detector] }),
        `${line.toLowerCase()}-${detector.toLowerCase()}`,
      ),
    ),
  );
  const repeat = write(find({ kind: 'product', state: highMains, setUp: 1 }));
  const all = write(find({ kind: 'product', state: lowMains, setUp: 0 }));
  const commas = simulator.simulateSession(product, build, find({ kind: 'product', state: idle, setUp: 0 }), {
    delimiter: ';',
    decimalMark: ',',
  });
  const background = write(find({ kind: 'background', state: highMains, setUp: 0 }));
  return [
    ...singles.map((file) => ({
      ...file,
      about: 'one trace; 158 kHz is the second harmonic that was at 130 kHz before',
    })),
    { ...repeat, about: 'six traces in one file: the same state again on the next day' },
    { ...all, about: 'six traces in one file' },
    { ...renamed(commas, 'semicolon'), about: 'six traces, semicolons and decimal commas' },
    { ...background, about: 'six traces with the device off' },
    { ...broken(singles[0]), about: 'a file with a fault: one level is not a number, the import names its line' },
  ];
}

function renamed(file: DemoFile, suffix: string): DemoFile {
  return { ...file, fileName: file.fileName.replace(/\.csv$/, `_${suffix}.csv`) };
}

/** The same file with one level overwritten by a word, as when a receiver was stopped in the middle of a row. */
function broken(file: DemoFile): DemoFile {
  const rows = new TextDecoder().decode(file.bytes).split('\n');
  const middle = Math.floor(rows.length / 2);
  rows[middle] = rows[middle].replace(/,.*$/, ',overload');
  return { ...renamed(file, 'broken'), bytes: new TextEncoder().encode(rows.join('\n')), tags: [] };
}
