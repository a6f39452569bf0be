import js from '@eslint/js';
import angular from 'angular-eslint';
import prettier from 'eslint-config-prettier/flat';
import { existsSync, readdirSync } from 'node:fs';
import tseslint from 'typescript-eslint';

/** Folders of src/app that every feature may use; each other folder there is a feature. */
const commonRooms = ['shell', 'session', 'ui'];
const features = foldersIn('src/app').filter((name) => !commonRooms.includes(name));

const tests = ['**/*.spec.ts', 'test/**/*.ts'];
const database = '^(drizzle-orm|better-sqlite3)(/|$)';
const web = '^(express|express-session|express-rate-limit|helmet|multer|csrf-sync)$';
const charts = '^(echarts|ngx-echarts|zrender)(/|$)';
const processes = '(^|/)(server|jobs)/';

/** An import that is shut, and the door to take instead. */
const doors = {
  pure: { regex: '^node:', message: 'shared is pure: read files, clock and chance in server and hand the values in.' },
  packagesOfShared: {
    regex: '^(?!\\.|@shared/|zod$|zod/|simple-statistics$|jstat$|node:)',
    message: 'shared uses zod and numeric libraries only: do this in server or src.',
  },
  outOfShared: { regex: '(^|/)(server|jobs|src|test)/', message: 'shared knows nobody: hand the value in.' },
  arithmeticOnContracts: {
    regex: '/(contracts|access)/',
    message: 'Arithmetic stands apart from contracts and access: turn the request into plain values in server or src.',
  },
  aboveUnits: {
    regex: '/(statistics|limits|corrections|lisn|traces|detectors|judging|harmonics|simulation)/',
    message: 'units is the ground floor of shared: move what needs more up to the folder it is about.',
  },
  aboveLimits: {
    regex: '/(traces|detectors|judging|harmonics|simulation)/',
    message: 'statistics, limits, corrections and lisn stand below traces and judging: hand the numbers in.',
  },
  aboveTraces: {
    regex: '/(judging|harmonics|simulation)/',
    message: 'traces and detectors stand below judging and harmonics: hand the numbers in.',
  },
  aboveAccess: {
    regex: '^(\\.\\./|@shared/)(?!access/)',
    message: 'access stands apart: it knows roles and permissions only.',
  },
  features: { regex: '^\\.\\./(?!db/)', message: 'server/db knows tables, not features: put the rule in a verb.' },
  database: { regex: database, message: 'SQL lives in the *-store.ts of the feature: call its function.' },
  web: { regex: web, message: 'Express stops at *-routes.ts and server/http: hand plain values to the verb.' },
  routes: { regex: '-routes$', message: 'Routes are mounted in server/app.ts only: call the verb behind the route.' },
  stores: {
    regex: '(^|/)(?!session-store$)[^/]*-store$',
    allowTypeImports: true,
    message: 'A route or a job calls a verb; the verb calls its store.',
  },
  otherStores: {
    regex: '^\\.\\./(?!http/)[^.].*-store$',
    allowTypeImports: true,
    message: "Another feature's store is its own: call a verb of that feature.",
  },
  outOfStore: {
    regex: '^(\\./(?!.*-store$)|\\.\\./(?!db/))',
    message: 'A store holds SQL and knows server/db and shared only: decide in the verb, or in a policy it calls.',
  },
  processes: { regex: processes, message: 'Pages reach the server by HTTP: share the shape in shared/contracts.' },
  pages: { regex: '(^|/)src/', message: 'The server and the jobs know no pages.' },
  charts: { regex: charts, message: 'Charts go through the host component in src/app/ui/chart.' },
  ...(features.length > 0 && {
    otherFeatures: {
      regex: `^(\\.\\./)+(${features.join('|')})/`,
      message: 'A feature links to another by its route; what both need goes to src/app/ui or src/app/session.',
    },
  }),
};

export default tseslint.config(
  { ignores: ['dist/', 'coverage/', 'data/', '.angular/', '.cache/', 'migrations/'] },
  { linterOptions: { reportUnusedDisableDirectives: 'error' } },
  js.configs.recommended,
  {
    files: ['**/*.ts'],
    extends: [tseslint.configs.recommendedTypeChecked],
    languageOptions: { parserOptions: { projectService: true, tsconfigRootDir: import.meta.dirname } },
    rules: {
      eqeqeq: ['error', 'always', { null: 'ignore' }],
      '@typescript-eslint/no-unused-vars': ['error', { argsIgnorePattern: '^_', varsIgnorePattern: '^_' }],
      '@typescript-eslint/no-misused-promises': ['error', { checksVoidReturn: { arguments: false } }],
      '@typescript-eslint/no-namespace': ['error', { allowDeclarations: true }],
    },
  },
  {
    files: ['src/**/*.ts'],
    extends: [angular.configs.tsRecommended],
    processor: angular.processInlineTemplates,
    rules: {
      '@angular-eslint/prefer-on-push-component-change-detection': 'error',
      '@angular-eslint/prefer-signals': 'error',
      // Angular's validators are static methods handed over by name.
      '@typescript-eslint/unbound-method': ['error', { ignoreStatic: true }],
      '@angular-eslint/component-class-suffix': 'off',
      '@angular-eslint/directive-class-suffix': 'off',
    },
  },
  {
    files: ['src/**/*.html'],
    extends: [angular.configs.templateRecommended, angular.configs.templateAccessibility],
    rules: { '@angular-eslint/template/prefer-control-flow': 'error' },
  },
  {
    // Answers of supertest and of the browser are untyped.
    files: tests,
    rules: {
      '@typescript-eslint/no-unsafe-argument': 'off',
      '@typescript-eslint/no-unsafe-assignment': 'off',
      '@typescript-eslint/no-unsafe-call': 'off',
      '@typescript-eslint/no-unsafe-member-access': 'off',
      '@typescript-eslint/no-unsafe-return': 'off',
      '@typescript-eslint/unbound-method': 'off',
    },
  },
  {
    files: ['**/*.{js,mjs}'],
    languageOptions: { globals: { console: 'readonly', process: 'readonly', URL: 'readonly', fetch: 'readonly' } },
  },
  { files: ['src/public/**/*.js'], languageOptions: { sourceType: 'script', globals: browserGlobals() } },

  shut('shared/contracts/**', 'pure', 'packagesOfShared', 'outOfShared'),
  shut('shared/access/**', 'pure', 'packagesOfShared', 'outOfShared', 'aboveAccess'),
  shut('shared/{units,collections}/**', ...inArithmetic(), 'aboveUnits'),
  shut('shared/{statistics,limits,corrections,lisn}/**', ...inArithmetic(), 'aboveLimits'),
  shut('shared/{traces,detectors}/**', ...inArithmetic(), 'aboveTraces'),
  shut('shared/{judging,harmonics,simulation}/**', ...inArithmetic()),
  shut('server/*/**', 'pages', 'database', 'web', 'routes', 'otherStores'),
  shut('server/*/**/*-routes.ts', 'pages', 'database', 'stores'),
  shut('server/*/**/*-store.ts', 'pages', 'web', 'outOfStore'),
  shut('server/db/**', 'pages', 'features', 'web'),
  shut('server/http/**', 'pages', 'routes'),
  shut('jobs/**', 'pages', 'database', 'web', 'routes', 'stores'),
  shut('src/**', 'processes', 'charts'),
  shut('src/app/*/**', 'processes', 'charts', 'otherFeatures'),
  shut('src/app/ui/chart/**', 'processes', 'otherFeatures'),

  prettier,
);

/** The import rules of a folder; a later, narrower folder replaces them whole. Specs may look behind any door. */
function shut(folder, ...names) {
  const file = folder.endsWith('.ts') ? folder : `${folder}/*.ts`;
  const patterns = names.map((name) => doors[name]).filter(Boolean);
  return {
    files: [file],
    ignores: ['**/*.spec.ts'],
    rules: { '@typescript-eslint/no-restricted-imports': ['error', { patterns }] },
  };
}

function inArithmetic() {
  return ['pure', 'packagesOfShared', 'outOfShared', 'arithmeticOnContracts'];
}

function foldersIn(path) {
  if (!existsSync(path)) return [];
  return readdirSync(path, { withFileTypes: true })
    .filter((entry) => entry.isDirectory())
    .map((entry) => entry.name);
}

function browserGlobals() {
  return { document: 'readonly', localStorage: 'readonly', window: 'readonly', matchMedia: 'readonly' };
}
