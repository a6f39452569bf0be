import presets from 'jest-preset-angular/presets/index.js';

const rootDir = new URL('..', import.meta.url).pathname.replace(/\/$/, '');

/** Packages that ship ES modules only, which Jest must turn into CommonJS. */
const esModulesOnly = '(.*\\.mjs$|echarts/|zrender/|@angular/common/locales/.*\\.js$)';

const shared = {
  rootDir,
  cacheDirectory: '<rootDir>/.cache/jest',
  modulePathIgnorePatterns: ['<rootDir>/dist/', '<rootDir>/.cache/', '<rootDir>/.angular/'],
  moduleNameMapper: { '^@shared/(.*)$': '<rootDir>/shared/$1' },
};

const onNode = {
  ...shared,
  testEnvironment: 'node',
  transform: {
    '^.+\\.(ts|js|mjs)$': [
      '@swc/jest',
      { jsc: { target: 'es2022', parser: { syntax: 'typescript' } }, module: { type: 'commonjs' } },
    ],
  },
};

/** @type {import('jest').Config} */
export default {
  rootDir,
  reporters: ['default', '<rootDir>/test/support/plain-line-reporter.mjs'],
  projects: [
    {
      ...presets.createCjsPreset({ tsconfig: '<rootDir>/test/tsconfig.json' }),
      ...shared,
      displayName: 'client',
      testMatch: ['<rootDir>/src/**/*.spec.ts'],
      setupFilesAfterEnv: ['<rootDir>/test/support/set-up-client.ts'],
      transformIgnorePatterns: [`node_modules/(?!${esModulesOnly})`],
    },
    {
      ...onNode,
      displayName: 'server',
      setupFiles: ['<rootDir>/test/support/seed-properties.ts'],
      testMatch: [
        '<rootDir>/{shared,server,jobs}/**/*.spec.ts',
        '<rootDir>/test/{server,jobs,architecture}/**/*.spec.ts',
      ],
    },
    {
      ...onNode,
      displayName: 'e2e',
      testMatch: ['<rootDir>/test/e2e/**/*.spec.ts'],
      globalSetup: '<rootDir>/test/support/find-browser.mjs',
      runner: '<rootDir>/test/support/serial-runner.mjs',
    },
  ],
};
