import { importsOf, sourceFiles, textOf } from './source-files';

const WITHOUT_EVAL = 'src/app/ui/zod-without-eval.ts';

/** Whether loading the file loads zod. */
function loadsZod(file: string, seen = new Set<string>()): boolean {
  if (seen.has(file)) return false;
  seen.add(file);
  return importsOf(file)
    .filter(({ isTypeOnly }) => !isTypeOnly)
    .some(({ target, isPackage }) => target === 'zod' || (!isPackage && loadsZod(target, seen)));
}

it('lets a page load zod only with its trial of eval switched off first', () => {
  const pages = sourceFiles().filter((file) => file.startsWith('src/') && file !== WITHOUT_EVAL);
  const direct = pages.filter((file) =>
    importsOf(file).some(({ target, isTypeOnly }) => !isTypeOnly && target.startsWith('shared/') && loadsZod(target)),
  );
  expect(direct.length).toBeGreaterThan(0);
  const careless = direct.filter((file) => !/^import '[./]+ui\/zod-without-eval';/.test(textOf(file)));
  expect(careless).toEqual([]);
});
