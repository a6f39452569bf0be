import type { DigestPatch, DigestRecipientInput } from '@shared/contracts/digests';
import type * as z from 'zod';
import { personWithEmail } from '../accounts/find-person';
import { personActor } from '../accounts/person-actor';
import type { Actor, PersonActor } from '../actor';
import { recordAudit } from '../audit/record-audit';
import type { Context } from '../context';
import { withTransaction } from '../db/with-transaction';
import { ServiceError } from '../service-error';
import type { Team } from '../teams/team-store';
import { newSecret } from '../tokens/token-secret';
import {
  deleteRecipient,
  findRecipientBySecret,
  listRecipients,
  markUnsubscribed,
  readSetting,
  upsertRecipient,
  writeSetting,
} from './digest-store';

/** Changes when the digest goes out, or whether. */
export function editDigest(context: Context, actor: Actor, team: Team, patch: z.infer<typeof DigestPatch>): void {
  withTransaction(context.db, () => {
    const before = readSetting(context.db, team.id);
    writeSetting(context.db, team.id, { ...before, ...patch });
    audit(context, actor, team, 'digest.changed', 'The time of the digest was changed', { before, now: patch });
  });
}

/**
 * Adds somebody to those who get the digest: a member for as long as they are one, or an address outside.
 *
 * @throws ServiceError `conflict` for somebody who unsubscribed
 */
export function addRecipient(
  context: Context,
  actor: Actor,
  team: Team,
  input: z.infer<typeof DigestRecipientInput>,
): void {
  withTransaction(context.db, () => {
    const standing = listRecipients(context.db, team.id).find(({ email }) => email === input.email);
    if (standing !== undefined && standing.unsubscribedAt !== null) {
      throw new ServiceError(
        'conflict',
        `email: ${input.email} unsubscribed; remove the address first if the person asks for the digest again`,
      );
    }
    const person = personWithEmail(context, input.email);
    const member = person && personActor(context, person.id);
    upsertRecipient(context.db, {
      ...input,
      teamId: team.id,
      personId: member?.roles.has(team.id) ? member.personId : null,
      unsubscribeSecret: newSecret(),
      createdAt: context.now(),
    });
    audit(context, actor, team, 'digest.recipientAdded', `${input.email} gets the digest`, { now: input });
  });
}

/** @throws ServiceError `notFound` when the team has no such recipient */
export function removeRecipient(context: Context, actor: Actor, team: Team, id: number): void {
  withTransaction(context.db, () => {
    const recipient = listRecipients(context.db, team.id).find((one) => one.id === id);
    if (recipient === undefined || !deleteRecipient(context.db, team.id, id)) {
      throw new ServiceError('notFound', `the team has no digest recipient number ${id}`);
    }
    audit(context, actor, team, 'digest.recipientRemoved', `${recipient.email} no longer gets the digest`, {
      before: recipient.email,
    });
  });
}

/** Switches the digest on or off for the asking member. */
export function setOwnDigest(context: Context, person: PersonActor, team: Team, isOn: boolean): void {
  const { personId, email, name } = person;
  withTransaction(context.db, () => {
    if (isOn) {
      upsertRecipient(context.db, {
        teamId: team.id,
        personId,
        email,
        name,
        unsubscribeSecret: newSecret(),
        createdAt: context.now(),
      });
    } else {
      const own = listRecipients(context.db, team.id).filter((recipient) => recipient.email === email);
      for (const { id } of own) markUnsubscribed(context.db, id, context.now());
    }
  });
}

/** Ends the digest for whoever holds the link. Says the same for a link that is unknown: there is nothing left to end. */
export function unsubscribe(context: Context, secret: string): void {
  const recipient = findRecipientBySecret(context.db, secret);
  if (recipient?.unsubscribedAt === null) markUnsubscribed(context.db, recipient.id, context.now());
}

function audit(
  context: Context,
  actor: Actor,
  team: Team,
  action: string,
  summary: string,
  details: Record<string, unknown>,
): void {
  recordAudit(context, actor, { teamId: team.id, action, subjectKind: 'digest', subjectId: team.id, summary, details });
}
