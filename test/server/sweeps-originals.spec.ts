import { existsSync, utimesSync, writeFileSync } from 'node:fs';
import { eq } from 'drizzle-orm';
import { importBatches, importItems, sweeps } from '../../server/db/schema';
import { sha256 } from '../../server/sweeps/original-files';
import { pruneOriginals } from '../../server/sweeps/prune-originals';
import { deleteSweep } from '../../server/sweeps/sweep-store';
import { buildTags, importBuiltSweep } from '../builders/sweep-builder';
import { buildBench, buildPerson, buildProduct, buildTeam } from '../builders/team-builder';
import { createTestContext, type TestContext } from '../support/test-context';

describe('original files', () => {
  let context: TestContext;

  beforeEach(() => (context = createTestContext()));
  afterEach(() => context.close());

  /** Makes a file look as if it had been kept two days ago. */
  function age(hash: string): void {
    const at = new Date(context.now() - 48 * 3600_000);
    utimesSync(context.originals.pathOf(hash), at, at);
  }

  it('come back byte for byte, or not at all when they changed on disk', () => {
    const bytes = Buffer.from('1;2\n3;4\n');
    const hash = context.originals.keep(bytes);
    expect(context.originals.read(hash).equals(bytes)).toBe(true);
    const other = context.originals.keep(Buffer.from('other'));
    writeFileSync(context.originals.pathOf(hash), Buffer.from(context.originals.read(other)));
    expect(() => context.originals.read(hash)).toThrow();
  });

  it('stay while a sweep or a batch names them, and go a day after nobody does', () => {
    const teamId = buildTeam(context).id;
    const { actor, person } = buildPerson(context, { teamId, role: 'technician' });
    const tags = buildTags(buildProduct(context, teamId), buildBench(context, teamId));
    const { sweepId } = importBuiltSweep(context, actor, tags);
    const ofSweep = context.db.select().from(sweeps).where(eq(sweeps.id, sweepId)).get()?.originalSha256 ?? '';
    const ofBatch = context.originals.keep(Buffer.from('waiting'));
    const batch = { teamId, createdBy: person.id, createdAt: context.now(), tags: {} };
    const { id: batchId } = context.db.insert(importBatches).values(batch).returning().get();
    context.db.insert(importItems).values({ batchId, fileName: 'a', originalSha256: ofBatch, tags: {} }).run();
    const ofNobody = context.originals.keep(Buffer.from('failed'));
    const young = context.originals.keep(Buffer.from('uploading'));
    for (const hash of [ofSweep, ofBatch, ofNobody]) age(hash);
    utimesSync(context.originals.pathOf(young), new Date(context.now()), new Date(context.now()));
    expect(pruneOriginals(context)).toBe(1);
    const areKept = () => [ofSweep, ofBatch, ofNobody, young].map((hash) => existsSync(context.originals.pathOf(hash)));
    expect(areKept()).toEqual([true, true, false, true]);
    deleteSweep(context.db, sweepId);
    expect(pruneOriginals(context)).toBe(1);
    expect(areKept()).toEqual([false, true, false, true]);
  });

  it('kept again count as new', () => {
    const bytes = Buffer.from('twice');
    const hash = context.originals.keep(bytes);
    age(hash);
    context.originals.keep(bytes);
    context.clock.set(Date.now());
    expect(pruneOriginals(context)).toBe(0);
    expect(context.originals.read(sha256(bytes)).equals(bytes)).toBe(true);
  });
});
