import { readdirSync } from 'node:fs';

const agreed = [
  '.ci',
  '.editorconfig',
  '.env.example',
  '.gitignore',
  '.npmrc',
  '.prettierignore',
  '.prettierrc',
  'DEVELOPERS.md',
  'README.md',
  'angular.json',
  'drizzle.config.ts',
  'eslint.config.js',
  'jobs',
  'migrations',
  'package-lock.json',
  'package.json',
  'server',
  'shared',
  'src',
  'test',
  'tsconfig.json',
];

/** Made by a tool or a run, never committed. */
const ignored = ['.git', '.angular', '.cache', '.env', 'coverage', 'data', 'dist', 'node_modules'];

it('holds at its top level exactly the agreed files and folders', () => {
  const found = readdirSync('.').filter((name) => !ignored.includes(name));
  expect(found.sort()).toEqual(agreed.sort());
});
