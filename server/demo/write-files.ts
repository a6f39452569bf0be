import { mkdirSync, writeFileSync } from 'node:fs';
import { join, resolve } from 'node:path';
import { parseArgs } from 'node:util';
import { type ImportableFile, simulateDemoFiles } from './simulate-demo-files';

const { values } = parseArgs({ options: { out: { type: 'string', default: './data/demo-files' } } });
const folder = resolve(values.out);
const files = simulateDemoFiles(Date.now());

mkdirSync(folder, { recursive: true });
for (const { fileName, bytes } of files) {
  writeFileSync(join(folder, fileName), bytes);
}
writeFileSync(join(folder, 'tags.json'), `${JSON.stringify(tagsByFile(files), null, 2)}\n`);
writeFileSync(join(folder, 'README.txt'), readMe(files));
console.log(`${files.length} sweep files, tags.json and README.txt written to ${folder}`);

function tagsByFile(importable: ImportableFile[]): Record<string, ImportableFile['tags']> {
  return Object.fromEntries(importable.map(({ fileName, tags }) => [fileName, tags]));
}

function readMe(importable: ImportableFile[]): string {
  const [common] = importable[0].tags;
  return [
    'Sweep files to try the import with. The product, its people and these levels are invented.',
    '',
    'They are the next build of the bench adapter: new firmware switches at 79 kHz instead of 65 kHz.',
    'Sign in as a technician of the charging team, import the files with the tags below, then have the build judged.',
    '',
    `product    ${common.product}`,
    `hardware   ${common.hardware}`,
    `firmware   ${common.firmware}`,
    `unit       ${common.unit}`,
    `bench      ${common.bench}`,
    `corrected  yes, the files hold corrected levels`,
    '',
    'Line and detector stand in the heading of every level column. Which state and run belong to which file:',
    '',
    ...importable.map(describe),
    '',
    'tags.json holds the same, one set of tags a trace, as POST /api/v1/sweeps takes them.',
    '',
  ].join('\n');
}

function describe({ fileName, tags, about }: ImportableFile): string {
  const given = tags.length === 0 ? '' : `\n  state "${tags[0].state}", run ${tags[0].run}, ${tags[0].kind}`;
  return `${fileName}\n  ${about}${given}`;
}
