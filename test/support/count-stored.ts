import { readdirSync } from 'node:fs';
import type { TestContext } from './test-context';

/** Rows of every table and the number of kept original files: equal before and after means nothing was stored. */
export function countStored(context: TestContext): Record<string, number> {
  const client = context.db.$client;
  const tables = client
    .prepare("select name from sqlite_master where type = 'table' and name not like '%\\_\\_%' escape '\\'")
    .pluck()
    .all() as string[];
  const rows = tables.map((table) => [
    table,
    client.prepare(`select count(*) from "${table}"`).pluck().get() as number,
  ]);
  return { ...(Object.fromEntries(rows) as Record<string, number>), files: countOriginals(context) };
}

function countOriginals(context: TestContext): number {
  try {
    const entries = readdirSync(context.config.originalsDir, { recursive: true, withFileTypes: true });
    return entries.filter((entry) => entry.isFile()).length;
  } catch {
    return 0;
  }
}
