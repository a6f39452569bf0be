import { and, asc, eq, gt, isNull } from 'drizzle-orm';
import type { Database } from '../db/open-database';
import { invitations, people } from '../db/schema';

export type Invitation = typeof invitations.$inferSelect;

/** Neither accepted nor revoked. */
const isUnanswered = and(isNull(invitations.acceptedAt), isNull(invitations.revokedAt));

export function insertInvitation(db: Database, invitation: typeof invitations.$inferInsert): Invitation {
  return db.insert(invitations).values(invitation).returning().get();
}

export function updateInvitation(
  db: Database,
  id: number,
  change: Partial<typeof invitations.$inferInsert>,
): Invitation {
  return db.update(invitations).set(change).where(eq(invitations.id, id)).returning().get();
}

/** Unanswered invitations of a team with who sent them, those that ran out too, oldest first. */
export function listUnanswered(db: Database, teamId: number): { invitation: Invitation; invitedByName: string }[] {
  return db
    .select({ invitation: invitations, invitedByName: people.name })
    .from(invitations)
    .innerJoin(people, eq(people.id, invitations.invitedBy))
    .where(and(eq(invitations.teamId, teamId), isUnanswered))
    .orderBy(asc(invitations.id))
    .all();
}

export function findUnanswered(db: Database, teamId: number, id: number): Invitation | undefined {
  return db
    .select()
    .from(invitations)
    .where(and(eq(invitations.teamId, teamId), eq(invitations.id, id), isUnanswered))
    .get();
}

export function findUnansweredFor(db: Database, teamId: number, email: string): Invitation | undefined {
  return db
    .select()
    .from(invitations)
    .where(and(eq(invitations.teamId, teamId), eq(invitations.email, email), isUnanswered))
    .get();
}

/** The invitation with this hash if it can still be accepted. */
export function findOpenInvitation(db: Database, tokenHash: string, now: number): Invitation | undefined {
  return db
    .select()
    .from(invitations)
    .where(and(eq(invitations.tokenHash, tokenHash), gt(invitations.expiresAt, now), isUnanswered))
    .get();
}
