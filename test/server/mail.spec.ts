import { eq } from 'drizzle-orm';
import { createServer, type AddressInfo, type Server } from 'node:net';
import request from 'supertest';
import { createApp } from '../../server/app';
import { outboxAttachments, outboxMails } from '../../server/db/schema';
import { type Mailbox, openMailbox } from '../../server/mail/open-mailbox';
import { pruneMail } from '../../server/mail/prune-mail';
import { queueMail } from '../../server/mail/queue-mail';
import { requestDueMail } from '../../server/mail/request-mail';
import { sendWaitingMail, withLocalMailbox } from '../support/local-mailbox';
import { signInAs } from '../support/sign-in';
import { createTestContext, type TestContext } from '../support/test-context';

const MINUTE_MS = 60_000;
let context: TestContext;
let mailbox: Mailbox;

beforeEach(async () => ({ context, mailbox } = await withLocalMailbox(createTestContext())));
afterEach(async () => {
  await mailbox.close();
  context.close();
});

function queue(onceKey: string, toEmail = 'reader@strandline.example') {
  return queueMail(context, {
    teamId: null,
    kind: 'digest',
    onceKey,
    toEmail,
    subject: 'Größe µV',
    text: 'plain',
    html: '<p>rich <img src="cid:trend"></p>',
    headers: { 'List-Unsubscribe': '<https://strandline.example/u>' },
    attachments: [
      { fileName: 'trend.png', contentId: 'trend', contentType: 'image/png', content: Buffer.from([1, 2, 3]) },
    ],
  });
}

const row = (id: number) => context.db.select().from(outboxMails).where(eq(outboxMails.id, id)).get();

describe('the outbox', () => {
  it('empties what was sent a month ago and keeps its record, so that it is not written again', async () => {
    const { id } = queue('week 10');
    await sendWaitingMail(context);
    context.clock.advance(29 * 24 * 60 * MINUTE_MS);
    const { id: waiting } = queue('week 14');
    expect(pruneMail(context)).toBe(0);
    context.clock.advance(2 * 24 * 60 * MINUTE_MS);
    expect(pruneMail(context)).toBe(1);
    expect(row(id)).toMatchObject({ status: 'sent', text: '', html: '' });
    expect(
      context.db
        .select()
        .from(outboxAttachments)
        .all()
        .map(({ mailId }) => mailId),
    ).toEqual([waiting]);
    expect(queue('week 10').id).toBe(id);
    expect(pruneMail(context)).toBe(0);
  });

  it('hands a mail to the server and the mailbox page shows it whole', async () => {
    const { id } = queue('week 10');
    await sendWaitingMail(context);
    expect(row(id)).toMatchObject({ status: 'sent', attempts: 1, sentAt: context.now(), lastError: null });
    const app = createApp(context);
    const { body: list } = await request(app).get('/api/mailbox').expect(200);
    expect(list).toEqual([
      expect.objectContaining({ to: 'reader@strandline.example', subject: 'Größe µV', from: expect.any(String) }),
    ]);
    const { body: message } = await request(app).get(`/api/mailbox/${list[0].id}`).expect(200);
    expect(message.text.trim()).toBe('plain');
    expect(message.html).toContain('src="data:image/png;base64,AQID"');
    expect(message.attachments).toEqual([
      expect.objectContaining({ fileName: 'trend.png', contentType: 'image/png', byteLength: 3 }),
    ]);
    expect(message.headers).toContainEqual({ name: 'List-Unsubscribe', value: '<https://strandline.example/u>' });
    await request(app).get('/api/mailbox/999').expect(404);
  });

  it('writes a mail with the same once-key once ever', async () => {
    expect(queue('week 10').id).toBe(queue('week 10').id);
    await sendWaitingMail(context);
    queue('week 10');
    requestDueMail(context, 'schedule');
    await sendWaitingMail(context);
    expect((await request(createApp(context)).get('/api/mailbox')).body).toHaveLength(1);
  });

  it('passes by a mail that another worker has begun', async () => {
    const { id } = queue('week 10');
    context.db
      .update(outboxMails)
      .set({ attempts: 1, nextAttemptAt: context.now() + 2 * MINUTE_MS })
      .where(eq(outboxMails.id, id))
      .run();
    await sendWaitingMail(context);
    expect(row(id)?.status).toBe('waiting');
  });
});

describe('a mail server that does not take the mail', () => {
  it('is tried again after 2, then 10 minutes, and keeps the reason until it works', async () => {
    const { id } = queue('week 10');
    await mailbox.close();
    await sendWaitingMail(context);
    expect(row(id)).toMatchObject({
      status: 'waiting',
      attempts: 1,
      lastError: expect.stringContaining('ECONNREFUSED'),
    });
    requestDueMail(context, 'schedule');
    await sendWaitingMail(context);
    expect(row(id)?.attempts).toBe(1);
    context.clock.advance(2 * MINUTE_MS);
    requestDueMail(context, 'schedule');
    await sendWaitingMail(context);
    expect(row(id)).toMatchObject({ attempts: 2, nextAttemptAt: context.now() + 10 * MINUTE_MS });
    const reopened = await withLocalMailbox(context);
    context.clock.advance(10 * MINUTE_MS);
    requestDueMail(reopened.context, 'schedule');
    await sendWaitingMail(reopened.context);
    expect(row(id)).toMatchObject({ status: 'sent', attempts: 3, lastError: null });
    await reopened.mailbox.close();
  });

  it('leaves the other mails untried when it is not there', async () => {
    const first = queue('week 10', 'one@strandline.example');
    const second = queue('week 11', 'two@strandline.example');
    await mailbox.close();
    await sendWaitingMail(context);
    expect([row(first.id)?.attempts, row(second.id)?.attempts]).toEqual([1, 0]);
  });

  it('is given up after the seventh attempt', async () => {
    const { id } = queue('week 10');
    await mailbox.close();
    for (let attempt = 0; attempt < 7; attempt += 1) {
      requestDueMail(context, 'schedule');
      await sendWaitingMail(context);
      context.clock.advance(1440 * MINUTE_MS);
    }
    expect(row(id)).toMatchObject({ status: 'failed', attempts: 7 });
  });

  it('fails one refused address at once and still sends the rest', async () => {
    const refused = queue('week 10', 'no-domain');
    const taken = queue('week 11', 'two@strandline.example');
    await sendWaitingMail(context);
    expect(row(refused.id)).toMatchObject({ status: 'failed', attempts: 1 });
    expect(row(taken.id)?.status).toBe('sent');
  });
});

describe('the local mailbox', () => {
  it('says in one line that its port is taken', async () => {
    const blocker: Server = createServer();
    const port = await new Promise<number>((resolve) =>
      blocker.listen(0, '127.0.0.1', () => resolve((blocker.address() as AddressInfo).port)),
    );
    const busy = { ...context, config: { ...context.config, mail: { kind: 'local', port } as const } };
    await expect(openMailbox(busy)).rejects.toThrow(
      `MAILBOX_PORT: port ${port} of 127.0.0.1 is taken; choose another or 0`,
    );
    await new Promise((resolve) => blocker.close(resolve));
  });

  it('does not exist where mail goes to a mail server', async () => {
    const real = createTestContext({ SMTP_URL: 'smtp://mail.strandline.example' });
    expect(await openMailbox(real)).toBeUndefined();
    await request(createApp(real)).get('/api/mailbox').expect(404);
    real.close();
  });

  it('opens for administrators alone once the installation listens to a network', async () => {
    const open = { ...context, config: { ...context.config, host: '0.0.0.0' } };
    const app = createApp(open);
    await request(app).get('/api/mailbox').expect(401);
    const { visitor: member } = await signInAs(open, app);
    await member.get('/api/mailbox').expect(403);
    const { visitor: administrator } = await signInAs(open, app, { isAdministrator: true });
    await administrator.get('/api/mailbox').expect(200);
  });
});
