import { simpleParser } from 'mailparser';
import request from 'supertest';
import { createApp } from '../../server/app';
import { mailboxMessages, outboxMails } from '../../server/db/schema';
import { requestDueDigests } from '../../server/digests/request-digests';
import { listReaders, upsertRecipient, writeSetting } from '../../server/digests/digest-store';
import { writeDigest } from '../../server/digests/write-digest';
import { judgeProductNow } from '../../server/judging/judge-stale-builds';
import type { Mailbox } from '../../server/mail/open-mailbox';
import { claimRun, LEASE_MS } from '../../server/queue/claim-run';
import { HeldRun } from '../../server/queue/held-run';
import { buildSweep } from '../builders/sweep-builder';
import { buildBench, buildPerson, buildProduct, buildTeam } from '../builders/team-builder';
import { sendWaitingMail, withLocalMailbox } from '../support/local-mailbox';
import { signInAs } from '../support/sign-in';
import { createTestContext, type TestContext } from '../support/test-context';

let context: TestContext;
let mailbox: Mailbox;
let teamId: number;

beforeEach(async () => {
  const made = await withLocalMailbox(createTestContext());
  context = made.context;
  mailbox = made.mailbox;
  context.clock.set(Date.parse('2026-03-06T12:00:00Z'));
  teamId = buildTeam(context, { key: 'chargers', name: 'Chargers', timeZone: 'Europe/Lisbon', createdAt: 0 }).id;
  writeSetting(context.db, teamId, { isOn: true, weekday: 1, hour: 7 });
  for (const name of ['runa', 'ivo']) subscribe(`${name}@strandline.example`);
});
afterEach(async () => {
  await mailbox.close();
  context.close();
});

function subscribe(email: string): void {
  upsertRecipient(context.db, { teamId, email, name: email, unsubscribeSecret: `secret-of-${email}`, createdAt: 0 });
}

/** Three builds of which the last lost 12 dB at 501 kHz in both runs. */
function buildLoss(): void {
  const product = buildProduct(context, teamId, { key: 'psu-240', name: 'Supply 240 W' });
  const bench = buildBench(context, teamId);
  const runs: [firmware: string, day: string, levelDbuv: number][] = [
    ['1.0', '2026-02-20', 40],
    ['1.0', '2026-02-21', 40.2],
    ['1.0', '2026-02-22', 39.9],
    ['1.1', '2026-03-04', 52],
    ['1.1', '2026-03-05', 52.3],
    ['1.1', '2026-03-06', 52.1],
  ];
  for (const [firmware, day, level] of runs) {
    buildSweep(context, product, bench, { firmware, takenAt: `${day}T08:00:00Z` }, { peaks: [[501_000, level]] });
  }
  judgeProductNow(context, product.id);
}

async function workDigest(worker: string): Promise<boolean> {
  const run = claimRun(context, worker, ['digest']);
  if (run === undefined) return false;
  const held = new HeldRun(context, run, worker);
  await writeDigest(context, held);
  held.finish();
  return true;
}

const mails = () => context.db.select().from(outboxMails).all();

describe('the weekly digest', () => {
  it('goes out when the hour has come in the zone of the team, to everybody once, whatever is asked again', async () => {
    buildLoss();
    context.clock.set(Date.parse('2026-03-09T06:59:00Z'));
    requestDueDigests(context, 'schedule');
    // The digest of the Monday before is older than three days and not sent late.
    expect(await workDigest('one')).toBe(false);

    context.clock.set(Date.parse('2026-03-09T07:00:00Z'));
    requestDueDigests(context, 'schedule');
    requestDueDigests(context, 'start');
    expect(await workDigest('one')).toBe(true);
    requestDueDigests(context, 'schedule');
    expect(await workDigest('one')).toBe(false);
    expect(mails().map(({ toEmail }) => toEmail)).toEqual(['ivo@strandline.example', 'runa@strandline.example']);
  });

  it('is written once when the worker dies in the middle and another takes over', async () => {
    buildLoss();
    context.clock.set(Date.parse('2026-03-09T07:05:00Z'));
    requestDueDigests(context, 'schedule');
    const run = claimRun(context, 'dying', ['digest']);
    if (run === undefined) throw new Error('no digest was asked for');
    await writeDigest(context, new HeldRun(context, run, 'dying'));
    context.clock.advance(LEASE_MS + 1);
    expect(await workDigest('second')).toBe(true);
    expect(mails()).toHaveLength(2);
  });

  it('tells the drop first, with text, HTML and a picture of the trend, and ends with one click', async () => {
    buildLoss();
    context.clock.set(Date.parse('2026-03-09T07:05:00Z'));
    requestDueDigests(context, 'schedule');
    await workDigest('one');
    await sendWaitingMail(context);
    const received = context.db.select().from(mailboxMessages).all();
    expect(received).toHaveLength(2);
    const mail = await simpleParser(received[0]?.raw ?? '');
    expect(mail.subject).toBe('Chargers: 1 new drop');
    const lines = mail.text?.split('\n').slice(0, 5) ?? [];
    expect(lines[0]).toMatch(
      /^Tightest: Supply 240 W C1 \/ 1\.1 has 3\.\d dB left at 501 kHz \(under the target of 6\.0 dB\)\.$/,
    );
    expect(lines[1]).toBe('Dropped: 1 new drop in Supply 240 W; none is open from before.');
    expect(mail.text).toMatch(/NEW DROPS\n- Supply 240 W: Firmware 1\.1 lost 12\.\d dB on L at 501 kHz \(QP\)/);
    // The parser puts attached pictures in place of their content ids.
    expect(mail.html).toContain('<img src="data:image/png;base64,');
    const [picture] = mail.attachments;
    expect(picture?.contentType).toBe('image/png');
    expect(picture?.content.subarray(1, 4).toString()).toBe('PNG');

    const header = (name: string) => mail.headerLines.find(({ key }) => key === name)?.line ?? '';
    expect(header('list-unsubscribe-post')).toContain('List-Unsubscribe=One-Click');
    const path = new URL(/<(.+)>/.exec(header('list-unsubscribe'))?.[1] ?? '').pathname;
    await request(createApp(context)).post(path).type('form').send('List-Unsubscribe=One-Click').expect(200);
    context.clock.set(Date.parse('2026-03-16T07:05:00Z'));
    requestDueDigests(context, 'schedule');
    await workDigest('one');
    expect(mails()).toHaveLength(3);
  });

  it('says in every line that there is nothing, when there is nothing', async () => {
    context.clock.set(Date.parse('2026-03-09T07:05:00Z'));
    requestDueDigests(context, 'schedule');
    await workDigest('one');
    expect(mails()[0]?.subject).toBe('Chargers: nothing dropped');
    expect(mails()[0]?.text.split('\n').slice(0, 5)).toEqual([
      'No build of any product is measured yet.',
      'Nothing dropped this week; none is open from before.',
      'Nothing gained margin or was closed this week.',
      'No slow loss is seen.',
      'Every required state of every newest build is measured.',
    ]);
  });

  it('no longer reaches a person who left the team', async () => {
    const { actor, person } = buildPerson(context, { teamId, role: 'viewer' });
    const { email, name } = person;
    upsertRecipient(context.db, { teamId, personId: person.id, email, name, unsubscribeSecret: 'own', createdAt: 0 });
    context.db.$client.prepare('delete from memberships where person_id = ?').run(actor.personId);
    context.clock.set(Date.parse('2026-03-09T07:05:00Z'));
    requestDueDigests(context, 'schedule');
    await workDigest('one');
    expect(mails().map(({ toEmail }) => toEmail)).toEqual(['ivo@strandline.example', 'runa@strandline.example']);
  });

  it('stays silent when it is switched off', async () => {
    writeSetting(context.db, teamId, { isOn: false, weekday: 1, hour: 7 });
    context.clock.set(Date.parse('2026-03-09T07:05:00Z'));
    requestDueDigests(context, 'schedule');
    expect(await workDigest('one')).toBe(false);
  });
});

describe('digest settings', () => {
  it('are a lead’s, a subscription is everybody’s own, and another team’s are unknown', async () => {
    const app = createApp(context);
    const { visitor: viewer } = await signInAs(context, app, { teamId, role: 'viewer' });
    const { visitor: lead } = await signInAs(context, app, { teamId, role: 'lead' });
    const { visitor: stranger } = await signInAs(context, app, { teamId: buildTeam(context).id, role: 'lead' });
    await viewer.patch('/api/teams/chargers/digest').send({ hour: 8 }).expect(403);
    await stranger.get('/api/teams/chargers/digest').expect(404);
    const { body } = await lead.patch('/api/teams/chargers/digest').send({ hour: 8 }).expect(200);
    expect(body).toMatchObject({ weekday: 1, hour: 8, isOn: true, nextAt: '2026-03-09T08:00:00.000Z', mine: false });
    await lead.patch('/api/teams/chargers/digest').send({ hour: 24 }).expect(400);
    expect((await viewer.put('/api/teams/chargers/digest/mine').send({ isOn: true }).expect(200)).body.mine).toBe(true);
    expect((await viewer.put('/api/teams/chargers/digest/mine').send({ isOn: false }).expect(200)).body.mine).toBe(
      false,
    );
  });

  it('send one now to the asking person alone', async () => {
    const { visitor, actor } = await signInAs(context, createApp(context), { teamId, role: 'lead' });
    await visitor.post('/api/teams/chargers/digest/now').expect(202);
    await workDigest('one');
    expect(mails().map(({ toEmail }) => toEmail)).toEqual([actor.email]);
    const { body } = await visitor.get('/api/teams/chargers/digest').expect(200);
    expect(body).toMatchObject({ mine: false, sent: [{ waiting: 1 }] });
  });

  it('end the digest of a member a lead added with the membership', async () => {
    const app = createApp(context);
    const { visitor: lead } = await signInAs(context, app, { teamId, role: 'lead' });
    const { person } = buildPerson(context, { teamId, role: 'viewer' });
    await lead.post('/api/teams/chargers/digest/recipients').send({ email: person.email }).expect(201);
    await lead.delete(`/api/teams/chargers/members/${person.id}`).expect(204);
    context.clock.set(Date.parse('2026-03-09T12:00:00Z'));
    requestDueDigests(context, 'schedule');
    await workDigest('one');
    expect(mails().map(({ toEmail }) => toEmail)).not.toContain(person.email);
  });

  it('keep somebody who unsubscribed from being added by the way', async () => {
    const app = createApp(context);
    const { visitor: lead } = await signInAs(context, app, { teamId, role: 'lead' });
    const add = () => lead.post('/api/teams/chargers/digest/recipients').send({ email: 'out@side.example' });
    const { body } = await add().expect(201);
    const [{ id }] = body.recipients.filter(({ email }: { email: string }) => email === 'out@side.example');
    const [recipient] = listReaders(context.db, teamId).filter((one) => one.id === id);
    await request(app).post(`/api/digest/unsubscribe/${recipient?.unsubscribeSecret}`).expect(200);
    expect((await add().expect(409)).body.detail).toContain('unsubscribed');
    await lead.delete(`/api/teams/chargers/digest/recipients/${id}`).expect(204);
    await add().expect(201);
  });
});
