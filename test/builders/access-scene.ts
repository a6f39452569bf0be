import { ROLES } from '@shared/access/roles';
import { TOKEN_SCOPES } from '@shared/access/token-scopes';
import { SweepTags } from '@shared/contracts/sweeps';
import { eq } from 'drizzle-orm';
import type { Express } from 'express';
import request, { type Test } from 'supertest';
import { createApp } from '../../server/app';
import { builds, drops, jobRuns, mailboxMessages, operatingStates } from '../../server/db/schema';
import { addRecipient } from '../../server/digests/edit-digest';
import { listRecipients } from '../../server/digests/digest-store';
import { judgeProductNow } from '../../server/judging/judge-stale-builds';
import { enqueueRun } from '../../server/queue/enqueue-run';
import { importSweep } from '../../server/sweeps/import-sweep';
import { startBatch } from '../../server/sweeps/start-batch';
import { inviteMember } from '../../server/teams/invite-member';
import { createToken } from '../../server/tokens/create-token';
import { signIn, TEST_PASSWORD_HASH, visit, type Visitor } from '../support/sign-in';
import type { TestContext } from '../support/test-context';
import { measureBuild, measureQuietBuilds } from './bench-day';
import { buildSweepFile, buildTags } from './sweep-builder';
import { buildBench, buildPerson, buildProduct, buildTeam, buildToken } from './team-builder';

/** Who asks: nobody, every role and token of the team, a lead and a full token of another team, an administrator in no team. */
export const CALLERS = ['nobody', ...ROLES, ...TOKEN_SCOPES, 'foreign lead', 'foreign token', 'administrator'] as const;
export type Caller = (typeof CALLERS)[number];
export type Method = 'get' | 'post' | 'put' | 'patch' | 'delete';

/** Stands in every name and note of the team, so that none of its data can go out unseen. */
export const MARK = 'Quillmark';

/** A team with one of everything that has a number or a key, one that has nothing to do with it, and who may ask. */
export interface AccessScene {
  app: Express;
  own: SceneIds;
  foreign: SceneIds;
  ask(caller: Caller, method: Method, path: string): Test;
}

/** Numbers and keys of what a team has. */
export interface SceneIds {
  team: string;
  product: string;
  bench: string;
  file: Buffer;
  person: number;
  newcomer: number;
  sweep: number;
  build: number;
  laterBuild: number;
  state: number;
  drop: number;
  batch: number;
  run: number;
  token: number;
  invitation: number;
  recipient: number;
}

export async function buildAccessScene(context: TestContext): Promise<AccessScene> {
  const app = createApp(context);
  const own = buildOwner(context, 'quills', MARK);
  const foreign = buildOwner(context, 'lamps', 'Lamp');
  context.db
    .insert(mailboxMessages)
    .values({ receivedAt: 0, fromAddress: 'a@b.example', toAddress: 'c@d.example', subject: '', raw: Buffer.from('') })
    .run();
  const administrator = buildPerson(context, { isAdministrator: true, passwordHash: TEST_PASSWORD_HASH }).person;
  const emails: [Caller, string][] = [
    ...own.members,
    ['foreign lead', foreign.members.find(([role]) => role === 'lead')?.[1] ?? ''],
    ['administrator', administrator.email],
  ];
  const visitors = new Map<Caller, Headers>([['nobody', headersOf(await visit(app))]]);
  for (const [caller, email] of emails) visitors.set(caller, headersOf(await signIn(app, email)));
  const tokens = new Map<Caller, string>([...own.tokens, ['foreign token', foreign.fullToken]]);
  return {
    app,
    own: own.ids,
    foreign: foreign.ids,
    ask: (caller, method, path) => {
      const headers = visitors.get(caller) ?? { authorization: `Bearer ${tokens.get(caller)}` };
      return request(app)[method](path).set(headers);
    },
  };
}

type Headers = Record<string, string>;

/** The cookies of this moment: a call that ends the session or changes its token leaves the next one as it was. */
function headersOf(visitor: Visitor): Headers {
  const token = visitor.cookie('XSRF-TOKEN');
  return { cookie: `strandline=${visitor.cookie('strandline')}; XSRF-TOKEN=${token}`, 'x-xsrf-token': token ?? '' };
}

function buildOwner(context: TestContext, key: string, name: string) {
  const { db } = context;
  const team = buildTeam(context, { key, name: `${name} team` });
  const people = ROLES.map((role) =>
    buildPerson(context, {
      teamId: team.id,
      role,
      name: `${name} ${role}`,
      email: `${role}@${key}.example`,
      passwordHash: TEST_PASSWORD_HASH,
    }),
  );
  const lead = people[people.length - 1].actor;
  const newcomer = buildPerson(context, { teamId: team.id, role: 'viewer', name: `${name} newcomer` }).person;
  const product = buildProduct(context, team.id, { key: `${key}-psu`, name: `${name} supply`, description: name });
  const bench = buildBench(context, team.id, { key: `${key}-bench`, name: `${name} bench`, notes: name });
  measureQuietBuilds(context, { product, bench });
  measureBuild(context, { product, bench }, 6, { levelsDbuv: [56.1, 55.9] });
  measureBuild(context, { product, bench }, 7, { levelsDbuv: [50.1, 49.9] });
  const file = buildSweepFile({ seed: key.length });
  const tags = SweepTags.parse(
    buildTags(product, bench, { firmware: '1.7', state: `${name} state`, takenAt: '2026-02-20T09:00:00Z' }),
  );
  const { sweepId } = importSweep(context, lead, { bytes: file, fileName: `${name}.csv`, tags });
  judgeProductNow(context, product.id);
  const buildAt = (position: number) =>
    db
      .select()
      .from(builds)
      .where(eq(builds.productId, product.id))
      .all()
      .find((one) => one.position === position)?.id;
  const staged = [{ fileName: `${name}.csv`, sha256: context.originals.keep(file) }];
  const batch = startBatch(context, lead, team, { tags, items: [{ file: 0, tags: {} }] }, staged);
  addRecipient(context, lead, team, { email: `outside@${key}.example`, name });
  const run = enqueueRun(context, lead, { job: 'judge', teamId: team.id, lockKey: `judge:${key}`, trigger: 'person' });
  const ids: SceneIds = {
    team: key,
    product: product.key,
    bench: bench.key,
    file,
    person: people[1].actor.personId,
    newcomer: newcomer.id,
    sweep: sweepId,
    build: buildAt(6) ?? 0,
    laterBuild: buildAt(7) ?? 0,
    state: db.select().from(operatingStates).where(eq(operatingStates.productId, product.id)).get()?.id ?? 0,
    drop: db.select().from(drops).where(eq(drops.productId, product.id)).get()?.id ?? 0,
    batch: batch.id,
    run: db.select().from(jobRuns).where(eq(jobRuns.id, run.id)).get()?.id ?? 0,
    token: createToken(context, lead, team.id, { name: `${name} token`, scopes: ['results:read'] }).token.id,
    invitation: inviteMember(context, lead, team, { email: `guest@${key}.example`, role: 'viewer' }).id,
    recipient: listRecipients(db, team.id)[0]?.id ?? 0,
  };
  return {
    ids,
    members: people.map(({ person }, index) => [ROLES[index], person.email] as [Caller, string]),
    tokens: TOKEN_SCOPES.map((scope) => [scope, buildToken(context, team.id, lead.personId, [scope])] as const),
    fullToken: buildToken(context, team.id, lead.personId),
  };
}
