import type { AuditEntryView, AuditPage } from '@shared/contracts/audit';
import type { Express } from 'express';
import { createApp } from '../../server/app';
import { recordAudit } from '../../server/audit/record-audit';
import { buildPerson, buildTeam } from '../builders/team-builder';
import { signInAs, type Visitor } from '../support/sign-in';
import { createTestContext, type TestContext } from '../support/test-context';

let context: TestContext;
let app: Express;
let lead: Visitor;
let teamId: number;

beforeEach(async () => {
  context = createTestContext();
  app = createApp(context);
  teamId = buildTeam(context, { key: 'drives', name: 'Drives' }).id;
  ({ visitor: lead } = await signInAs(context, app, { teamId, role: 'lead', name: 'Ada Vane' }));
});
afterEach(() => context.close());

const log = async (path = '/api/teams/drives/audit', visitor = lead): Promise<AuditEntryView[]> =>
  (await visitor.get(path).expect(200)).body.entries;

describe('the audit log', () => {
  it('tells who changed a setting, from what to what', async () => {
    await lead.patch('/api/teams/drives').send({ targetMarginDb: 4, name: 'Drives 2' }).expect(200);
    expect(await log()).toEqual([
      {
        id: expect.any(Number),
        at: new Date(context.now()).toISOString(),
        actor: 'Ada Vane',
        actorKind: 'person',
        action: 'team.changed',
        subjectKind: 'team',
        subjectId: String(teamId),
        summary: expect.stringContaining('targetMarginDb'),
        details: {
          before: { targetMarginDb: 6, name: 'Drives' },
          now: { targetMarginDb: 4, name: 'Drives 2' },
        },
      },
    ]);
  });

  it('holds every change of members, invitations and tokens', async () => {
    const { person } = buildPerson(context, { teamId, role: 'viewer' });
    const input = { email: 'x@strandline.example', role: 'viewer' };
    const { body: invitation } = await lead.post('/api/teams/drives/invitations').send(input);
    await lead.post(`/api/teams/drives/invitations/${invitation.id}/resend`).expect(204);
    await lead.delete(`/api/teams/drives/invitations/${invitation.id}`).expect(204);
    await lead.patch(`/api/teams/drives/members/${person.id}`).send({ role: 'engineer' }).expect(204);
    await lead.delete(`/api/teams/drives/members/${person.id}`).expect(204);
    const { body: token } = await lead.post('/api/teams/drives/tokens').send({ name: 'ci', scopes: ['gate:read'] });
    await lead.delete(`/api/teams/drives/tokens/${token.id}`).expect(204);
    const entries = await log();
    expect(entries.map(({ action }) => action).reverse()).toEqual([
      'invitation.sent',
      'invitation.sentAgain',
      'invitation.revoked',
      'member.roleChanged',
      'member.removed',
      'token.created',
      'token.revoked',
    ]);
    expect(entries.find(({ action }) => action === 'member.roleChanged')?.details).toEqual({
      before: { role: 'viewer' },
      now: { role: 'engineer' },
    });
  });

  it('writes nothing for a change that was refused', async () => {
    const { body: session } = await lead.get('/api/session');
    await lead.delete(`/api/teams/drives/members/${session.person.id}`).expect(409);
    expect(await log()).toEqual([]);
  });

  it('comes in pages, newest first, and ends', async () => {
    const { actor } = buildPerson(context, { teamId, role: 'lead' });
    for (let entry = 0; entry < 5; entry += 1) {
      recordAudit(context, actor, { teamId, action: 'x.done', subjectKind: 'x', subjectId: entry, summary: 'x' });
    }
    const pages: string[][] = [];
    let before = '';
    for (;;) {
      const page = (await lead.get(`/api/teams/drives/audit?limit=2${before}`).expect(200)).body as AuditPage;
      pages.push(page.entries.map(({ subjectId }) => subjectId));
      if (page.nextBefore === null) break;
      before = `&before=${page.nextBefore}`;
    }
    expect(pages).toEqual([['4', '3'], ['2', '1'], ['0']]);
    await lead.get('/api/teams/drives/audit?limit=0').expect(400);
  });

  it('keeps what concerns the installation for administrators', async () => {
    const { visitor: administrator } = await signInAs(context, app, { isAdministrator: true });
    const { person } = buildPerson(context);
    await administrator.patch(`/api/installation/people/${person.id}`).send({ isAdministrator: true }).expect(204);
    expect(await log()).toEqual([]);
    expect(await log('/api/installation/audit', administrator)).toEqual([
      expect.objectContaining({
        action: 'person.changed',
        details: {
          before: { isAdministrator: false, isDisabled: false },
          now: { isAdministrator: true, isDisabled: false },
        },
      }),
    ]);
  });
});
