import { importsOf, sourceFiles } from './source-files';

/** The first ring of files found that import one another, as the path round it, or undefined. */
function findRing(files: string[]): string[] | undefined {
  const done = new Set<string>();
  const trail: string[] = [];

  function visit(file: string): string[] | undefined {
    if (trail.includes(file)) return [...trail.slice(trail.indexOf(file)), file];
    if (done.has(file)) return undefined;
    trail.push(file);
    for (const next of targets.get(file) ?? []) {
      const ring = visit(next);
      if (ring) return ring;
    }
    trail.pop();
    done.add(file);
    return undefined;
  }

  const targets = new Map(files.map((file) => [file, importsOf(file).map(({ target }) => target)]));
  for (const file of files) {
    const ring = visit(file);
    if (ring) return ring;
  }
  return undefined;
}

it('has no ring of files that import one another', () => {
  expect(findRing(sourceFiles())).toBeUndefined();
});
