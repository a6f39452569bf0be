import { basename } from 'node:path';
import { filesIn } from './source-files';

const kebabCase = /^_?[a-z0-9]+(-[a-z0-9]+)*(\.(spec|d|conf|config))?\.[a-z0-9]+$/;
const bannedWords = /(^|[-/.])(utils?|helpers?|common|misc)([-/.]|$)/;

const files = filesIn('shared', 'server', 'jobs', 'src', 'test');

it('names every file in kebab-case, without .component or .service', () => {
  const odd = files.filter((file) => !kebabCase.test(basename(file)) && basename(file) !== 'ORIGIN.md');
  expect(odd).toEqual([]);
});

it('keeps the leading underscore to the parts of a style sheet', () => {
  expect(files.filter((file) => basename(file).startsWith('_') && !file.endsWith('.scss'))).toEqual([]);
});

it('names no file or folder utils, helpers, common or misc', () => {
  expect(files.filter((file) => bannedWords.test(file))).toEqual([]);
});

it('has no file that only passes others on, but the list of tables', () => {
  expect(files.filter((file) => basename(file) === 'index.ts')).toEqual(['server/db/schema/index.ts']);
});
