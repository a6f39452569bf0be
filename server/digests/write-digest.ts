import type { Context } from '../context';
import { withTransaction } from '../db/with-transaction';
import { queueMail } from '../mail/queue-mail';
import type { HeldRun } from '../queue/held-run';
import { teamById } from '../teams/find-team';
import { digestFacts, type DigestFacts } from './digest-facts';
import { isoWeek } from './digest-schedule';
import { type DigestRecipient, findDigest, insertDigest, listReaders } from './digest-store';
import { renderDigest, type RenderedDigest, UNSUBSCRIBE_PLACE } from './render-digest';
import { DigestOrder } from './digest-order';
import { trendPicture } from './trend-picture';

const WEEK_MS = 7 * 24 * 3600_000;

interface Picture {
  fileName: string;
  contentId: string;
  contentType: string;
  content: Buffer;
}

/**
 * Writes a team's digest and one mail a recipient. The text of a week is written once, each mail has a key of its own,
 * and both are stored in one transaction: however often the run restarts, nobody gets a week twice.
 */
export async function writeDigest(context: Context, held: HeldRun): Promise<void> {
  const order = DigestOrder.parse(held.run.payload);
  const { onlyRecipientId } = order;
  const team = teamById(context, order.teamId);
  const period = onlyRecipientId === undefined ? isoWeek(order.dueAt, team.timeZone) : `now-${held.run.id}`;
  const recipients = listReaders(context.db, team.id).filter(({ id, unsubscribedAt }) =>
    onlyRecipientId === undefined ? unsubscribedAt === null : id === onlyRecipientId,
  );
  held.expect(recipients.length);
  const facts = digestFacts(context, team, order.dueAt - WEEK_MS, order.dueAt);
  const pictures = await drawPictures(facts);
  held.report();
  withTransaction(context.db, () => {
    const standing = findDigest(context.db, team.id, period);
    const digest = standing ?? renderDigest(facts, context.config.publicUrl, contentIds(facts));
    if (standing === undefined)
      insertDigest(context.db, { ...digest, teamId: team.id, period, createdAt: context.now() });
    for (const recipient of recipients) {
      queueDigestMail(context, { teamId: team.id, period, digest, recipient, pictures });
      held.advance('written');
    }
  });
}

function queueDigestMail(
  context: Context,
  mail: {
    teamId: number;
    period: string;
    digest: RenderedDigest;
    recipient: DigestRecipient;
    pictures: readonly Picture[];
  },
): void {
  const { teamId, period, digest, recipient, pictures } = mail;
  const page = `${context.config.publicUrl}/unsubscribe/${recipient.unsubscribeSecret}`;
  const oneClick = `${context.config.publicUrl}/api/digest/unsubscribe/${recipient.unsubscribeSecret}`;
  queueMail(context, {
    teamId,
    kind: 'digest',
    onceKey: `digest:${teamId}:${period}:${recipient.id}`,
    toEmail: recipient.email,
    subject: digest.subject,
    text: digest.text.replaceAll(UNSUBSCRIBE_PLACE, page),
    html: digest.html.replaceAll(UNSUBSCRIBE_PLACE, page),
    // One-click unsubscribe as RFC 8058 asks for.
    headers: { 'List-Unsubscribe': `<${oneClick}>`, 'List-Unsubscribe-Post': 'List-Unsubscribe=One-Click' },
    attachments: pictures,
  });
}

function contentIds(facts: DigestFacts): Map<string, string> {
  return new Map(facts.products.map(({ key }) => [key, `trend-${key}`]));
}

async function drawPictures(facts: DigestFacts): Promise<Picture[]> {
  const pictures: Picture[] = [];
  for (const product of facts.products) {
    const content = await trendPicture(product);
    pictures.push({
      fileName: `${product.key}.png`,
      contentId: `trend-${product.key}`,
      contentType: 'image/png',
      content,
    });
  }
  return pictures;
}
