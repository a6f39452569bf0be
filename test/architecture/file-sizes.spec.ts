import { filesIn, sourceFiles, textOf } from './source-files';

const lineCount = (file: string): number => textOf(file).split('\n').length - 1;
/** Tables of numbers from a standard or a measurement may be as long as their source. */
const isTable = (file: string): boolean => /\/tables\/|^test\/golden\//.test(file);

it('keeps every file at 400 lines or less, tables apart', () => {
  const written = filesIn('shared', 'server', 'jobs', 'src', 'test').filter((file) =>
    /\.(ts|mjs|html|scss)$/.test(file),
  );
  const long = written.filter((file) => !isTable(file) && lineCount(file) > 400);
  expect(long.map((file) => `${file}: ${lineCount(file)}`)).toEqual([]);
});

it('keeps half of the files at 60 lines or less and nine in ten at 200 or less', () => {
  const sizes = sourceFiles()
    .filter((file) => !isTable(file))
    .map(lineCount)
    .sort((a, b) => a - b);
  const atFraction = (fraction: number): number => sizes[Math.floor(fraction * (sizes.length - 1))];
  expect(atFraction(0.5)).toBeLessThanOrEqual(60);
  expect(atFraction(0.9)).toBeLessThanOrEqual(200);
});
