import { count } from 'drizzle-orm';
import type { Database } from '../db/open-database';
import { benches, digestRecipients, digestSettings, memberships, people, teams } from '../db/schema';

/** Whether nothing was ever entered: an installation without people. */
export function isEmpty(db: Database): boolean {
  return (db.select({ people: count() }).from(people).get()?.people ?? 0) === 0;
}

export function insertTeam(db: Database, team: typeof teams.$inferInsert): typeof teams.$inferSelect {
  return db.insert(teams).values(team).returning().get();
}

export function insertMembership(db: Database, membership: typeof memberships.$inferInsert): void {
  db.insert(memberships).values(membership).run();
}

export function insertBench(db: Database, bench: typeof benches.$inferInsert): void {
  db.insert(benches).values(bench).run();
}

export function insertDigestSetting(db: Database, teamId: number): void {
  db.insert(digestSettings).values({ teamId }).run();
}

export function insertDigestRecipient(db: Database, recipient: typeof digestRecipients.$inferInsert): void {
  db.insert(digestRecipients).values(recipient).run();
}
