import { type Import, importsOf, sourceFiles } from './source-files';

/** Who may import whom, from DEVELOPERS.md; the first rule whose `files` fit a file is the one that holds. */
interface Rule {
  files: RegExp;
  /** Project paths and packages that may be imported; without it, all but `never`. */
  only?: RegExp;
  never?: RegExp;
}

const numericPackages = /^(zod(\/.*)?|simple-statistics|jstat)$/;
const database = /^(drizzle-orm|better-sqlite3)(\/|$)/;
const web = /^(express|express-session|express-rate-limit|helmet|multer|csrf-sync)$/;
const charts = /^(echarts|ngx-echarts|zrender)(\/|$)/;
const route = /-routes\.ts$/;
// The session store is the web layer's own: it stands in server/http and serves express-session.
const store = /^server\/(?!http\/).*-store\.ts$/;
const fromShared = (...folders: string[]): RegExp =>
  either(new RegExp(`^shared/(${folders.join('|')})/`), numericPackages);

const ground = ['units', 'collections'];
const tables = [...ground, 'statistics', 'limits', 'corrections', 'lisn'];
const readings = [...tables, 'traces', 'detectors'];
const judgements = [...readings, 'judging', 'harmonics', 'simulation'];

const rules: Rule[] = [
  { files: /^shared\/(units|collections)\//, only: fromShared(...ground) },
  { files: /^shared\/(statistics|limits|corrections|lisn)\//, only: fromShared(...tables) },
  { files: /^shared\/(traces|detectors)\//, only: fromShared(...readings) },
  { files: /^shared\/(judging|harmonics|simulation)\//, only: fromShared(...judgements) },
  { files: /^shared\/access\//, only: fromShared('access') },
  { files: /^shared\/contracts\//, only: fromShared('contracts', 'access', ...judgements) },
  { files: /^shared\//, only: /^$/ },

  { files: /^server\/db\//, only: either(/^(server\/db|shared)\//, database, /^(node:.*|zod)$/) },
  { files: store, only: either(/^(server\/db|shared)\//, database, /^node:/, store) },
  { files: /^server\/[^/]+\/.*-routes\.ts$/, never: either(database, store, /^(jobs|src|test)\//) },
  { files: /^server\/http\//, never: either(route, store, /^(jobs|src|test)\//) },
  { files: /^server\/[^/]+\//, never: either(database, web, route, /^(jobs|src|test)\//) },
  { files: /^server\//, never: /^(jobs|src|test)\// },

  { files: /^jobs\//, never: either(database, web, route, store, /^(server\/http|src|test)\//) },

  { files: /^src\/app\/ui\/chart\//, never: /^(server|jobs|test)\// },
  { files: /^src\//, never: either(charts, /^(server|jobs|test)\//, /^node:/) },
];

/** Folders of src/app that every feature may use. */
const commonRooms = ['shell', 'session', 'ui'];

function either(...patterns: RegExp[]): RegExp {
  return new RegExp(patterns.map((pattern) => `(?:${pattern.source})`).join('|'));
}

/** A verb's result may have the shape of a row: the type alone may be taken from a store. */
function isRowShape({ file, target, isTypeOnly }: Import): boolean {
  return isTypeOnly && store.test(target) && file.startsWith('server/') && !store.test(file);
}

function isForbidden(one: Import): boolean {
  if (isRowShape(one)) return false;
  const { file, target } = one;
  const rule = rules.find(({ files }) => files.test(file));
  if (rule === undefined) return true;
  return (rule.only !== undefined && !rule.only.test(target)) || (rule.never?.test(target) ?? false);
}

function roomOf(file: string, folder: RegExp): string | undefined {
  return folder.exec(file)?.[1];
}

const imports = sourceFiles().flatMap(importsOf);
const worded = (list: Import[]): string[] => list.map(({ file, target }) => `${file} imports ${target}`);

it('finds the imports it judges', () => {
  expect(imports.length).toBeGreaterThan(100);
});

it('keeps every import inside the import table', () => {
  expect(worded(imports.filter(isForbidden))).toEqual([]);
});

it("keeps the stores of a server feature to the feature's own verbs", () => {
  const feature = /^server\/([^/]+)\//;
  const foreign = imports.filter(
    (one) => store.test(one.target) && roomOf(one.file, feature) !== roomOf(one.target, feature) && !isRowShape(one),
  );
  expect(worded(foreign)).toEqual([]);
});

it('keeps the features of the pages apart', () => {
  const feature = /^src\/app\/([^/]+)\//;
  const foreign = imports.filter(({ file, target }) => {
    const room = roomOf(file, feature);
    const reached = roomOf(target, feature);
    return room !== undefined && reached !== undefined && reached !== room && !commonRooms.includes(reached);
  });
  expect(worded(foreign)).toEqual([]);
});

it('resolves every import of the project to a file', () => {
  const lost = imports.filter(({ target, isPackage }) => !isPackage && !/\.(ts|json)$/.test(target));
  expect(worded(lost)).toEqual([]);
});
