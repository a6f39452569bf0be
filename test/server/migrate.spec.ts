import { cpSync, mkdtempSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join, resolve } from 'node:path';
import { migrate, requireCurrentSchema } from '../../server/db/migrate';
import { openDatabase } from '../../server/db/open-database';
import { buildAccessScene } from '../builders/access-scene';
import { countStored } from '../support/count-stored';
import { createTestContext, type TestContext } from '../support/test-context';

let context: TestContext;
let folder: string;

beforeEach(async () => {
  context = createTestContext();
  await buildAccessScene(context);
  folder = mkdtempSync(join(tmpdir(), 'strandline-migrations-'));
  cpSync(resolve('migrations'), folder, { recursive: true });
});
afterEach(() => {
  context.close();
  rmSync(folder, { recursive: true, force: true });
});

/** Puts a migration after the last one, in the folder of this test. */
function addMigration(sql: string): void {
  const file = join(folder, 'meta/_journal.json');
  const journal = JSON.parse(readFileSync(file, 'utf8')) as { entries: { idx: number; when: number }[] };
  const last = journal.entries[journal.entries.length - 1];
  journal.entries.push({ ...last, idx: last.idx + 1, when: last.when + 1, ...{ tag: '9999_added' } });
  writeFileSync(file, JSON.stringify(journal));
  writeFileSync(join(folder, '9999_added.sql'), sql);
}

/** What the generator writes to change a column of a table: the table anew, its rows copied, the old one dropped. */
function rebuildOf(table: string): string {
  const created = context.db.$client.prepare('select sql from sqlite_master where name = ?').pluck().get(table);
  return [
    String(created).replace(/CREATE TABLE [`"]?\w+[`"]?/, 'CREATE TABLE `made_anew`'),
    `INSERT INTO \`made_anew\` SELECT * FROM \`${table}\``,
    `DROP TABLE \`${table}\``,
    `ALTER TABLE \`made_anew\` RENAME TO \`${table}\``,
  ].join(';\n--> statement-breakpoint\n');
}

const foreignKeys = () => context.db.$client.pragma('foreign_keys', { simple: true });

describe('migrating a filled database', () => {
  it('again changes nothing', () => {
    const before = countStored(context);
    migrate(context.db);
    expect(countStored(context)).toEqual(before);
    expect(foreignKeys()).toBe(1);
  });

  it('loses no row of the tables that point at a table made anew', () => {
    const before = countStored(context);
    addMigration(rebuildOf('teams'));
    migrate(context.db, folder);
    expect(countStored(context)).toEqual(before);
    expect(foreignKeys()).toBe(1);
    expect(context.db.$client.pragma('integrity_check', { simple: true })).toBe('ok');
  });

  it('stops, and changes nothing, when a step of it fails', () => {
    const before = countStored(context);
    addMigration('DELETE FROM `sessions`;\n--> statement-breakpoint\nDROP TABLE `none`;');
    expect(() => migrate(context.db, folder)).toThrow();
    expect(countStored(context)).toEqual(before);
  });

  it('stops when rows then point nowhere', () => {
    addMigration('DELETE FROM `builds`;');
    expect(() => migrate(context.db, folder)).toThrow(/point nowhere/);
  });
});

describe('a database of another version', () => {
  it('that is newer is refused by web server and jobs', () => {
    addMigration('CREATE TABLE `added` (`id` integer PRIMARY KEY);');
    migrate(context.db, folder);
    expect(() => migrate(context.db)).toThrow(/newer version/);
    expect(() => requireCurrentSchema(context.db)).toThrow(/schema/);
  });

  it('that is empty is refused by the jobs', () => {
    const empty = openDatabase(':memory:');
    expect(() => requireCurrentSchema(empty)).toThrow(/start the web server first/);
    empty.$client.close();
  });
});

it('every connection keeps foreign keys', () => {
  const orphan = context.db.$client.prepare("insert into units (product_id, serial, created_at) values (9999, 'x', 0)");
  expect(() => orphan.run()).toThrow(/FOREIGN KEY/);
});
