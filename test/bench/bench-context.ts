import { mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { readConfig } from '../../server/config/read-config';
import { type Context, createContext } from '../../server/context';
import { migrate } from '../../server/db/migrate';
import { buildBench, buildPerson, buildProduct, buildTeam, buildToken } from '../builders/team-builder';

export interface BenchContext extends Context {
  /** Of a technician of the team that owns the product of the synthetic tags. */
  actor: ReturnType<typeof buildPerson>['actor'];
  token: string;
  folder: string;
}

/** A context on a database file in a temporary folder, as in production, with a team, a product and a bench. */
export function openBenchContext(): BenchContext {
  const folder = mkdtempSync(join(tmpdir(), 'strandline-bench-'));
  const config = readConfig({ NODE_ENV: 'test', LOG_LEVEL: 'silent', STRANDLINE_DATA_DIR: folder });
  const context = createContext(config, 'bench');
  migrate(context.db);
  const team = buildTeam(context);
  const { actor, person } = buildPerson(context, { teamId: team.id, role: 'technician' });
  buildProduct(context, team.id, { key: 'bench-product' });
  buildBench(context, team.id, { key: 'bench-1' });
  return {
    ...context,
    actor,
    folder,
    token: buildToken(context, team.id, person.id),
    close: () => {
      context.close();
      rmSync(folder, { recursive: true, force: true });
    },
  };
}
