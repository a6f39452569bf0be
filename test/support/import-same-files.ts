import { SweepTags } from '@shared/contracts/sweeps';
import type { TokenActor } from '../../server/actor';
import { readConfig } from '../../server/config/read-config';
import { createContext } from '../../server/context';
import { requireCurrentSchema } from '../../server/db/migrate';
import { importSweep } from '../../server/sweeps/import-sweep';
import { buildSweepFile } from '../builders/sweep-builder';

/*
 * A process of its own that imports files, the same bytes and tags in every process that runs it, and says how many it was
 * the first to store. It begins when it is told to, so that several begin together.
 */
const context = createContext(readConfig(process.env), 'import-same-files');
requireCurrentSchema(context.db);
const [product, bench, teamId, count] = process.argv.slice(2);
const actor: TokenActor = {
  kind: 'token',
  tokenId: 1,
  name: 'bench',
  teamId: Number(teamId),
  scopes: ['sweeps:write'],
};
const files = Array.from({ length: Number(count) }, (_, index) => buildSweepFile({ seed: index + 1 }));

/** Two files a build, three states, two units: much of what an import makes anew is wanted by both processes at once. */
function tagsOf(index: number): SweepTags {
  return SweepTags.parse({
    product,
    bench,
    hardware: 'C1',
    firmware: `1.${Math.floor(index / 2)}`,
    state: `state ${index % 3}`,
    unit: `000${index % 2}`,
    line: 'L',
    detector: 'QP',
    rbwHz: 9000,
    corrected: true,
    takenAt: new Date(Date.UTC(2026, 2, 2) + index * 60_000).toISOString(),
  });
}

process.once('message', () => {
  const imported = files.map((bytes, index) =>
    importSweep(context, actor, { bytes, fileName: `${index}.csv`, tags: tagsOf(index) }),
  );
  context.close();
  process.send?.(imported.filter(({ duplicate }) => !duplicate).length);
  process.disconnect();
});
process.send?.('ready');
