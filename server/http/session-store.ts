import { eq, lt } from 'drizzle-orm';
import { type SessionData, Store } from 'express-session';
import type { Database } from '../db/open-database';
import { sessions } from '../db/schema';

const HOUR_MS = 3600_000;
/** How long a session lives after the last request. */
export const SESSION_MS = 7 * 24 * HOUR_MS;
/** How long one of somebody not signed in does, which only holds the token against cross-site requests. */
const VISIT_MS = 24 * HOUR_MS;
/** The life of a session is written again only once so much of it is gone: reading pages then writes nothing. */
const TOUCH_STEP_MS = HOUR_MS;

/** Passport keeps the signed-in person's id in the session under `passport.user`. */
interface SignedInSession extends SessionData {
  passport?: { user?: number };
}

/** express-session's store on the application's own database. */
export class SessionStore extends Store {
  constructor(
    private readonly db: Database,
    private readonly now: () => number,
  ) {
    super();
  }

  override get(sid: string, done: (error: unknown, session?: SessionData | null) => void): void {
    const row = this.db.select().from(sessions).where(eq(sessions.sid, sid)).get();
    const isAlive = row !== undefined && row.expiresAt > this.now();
    done(null, isAlive ? (JSON.parse(row.data) as SessionData) : null);
  }

  override set(sid: string, session: SignedInSession, done?: (error?: unknown) => void): void {
    const row = {
      data: JSON.stringify(session),
      personId: session.passport?.user ?? null,
      expiresAt: this.expiryOf(session),
    };
    this.db
      .insert(sessions)
      .values({ sid, ...row })
      .onConflictDoUpdate({ target: sessions.sid, set: row })
      .run();
    done?.();
  }

  override touch(sid: string, session: SignedInSession, done?: () => void): void {
    const expiresAt = this.expiryOf(session);
    const row = this.db.select({ at: sessions.expiresAt }).from(sessions).where(eq(sessions.sid, sid)).get();
    if (row !== undefined && row.at < expiresAt - TOUCH_STEP_MS)
      this.db.update(sessions).set({ expiresAt }).where(eq(sessions.sid, sid)).run();
    done?.();
  }

  private expiryOf({ passport }: SignedInSession): number {
    return this.now() + (passport?.user === undefined ? VISIT_MS : SESSION_MS);
  }

  override destroy(sid: string, done?: (error?: unknown) => void): void {
    this.db.delete(sessions).where(eq(sessions.sid, sid)).run();
    done?.();
  }
}

/** Ends every session of a person. */
export function endSessionsOf(db: Database, personId: number): void {
  db.delete(sessions).where(eq(sessions.personId, personId)).run();
}

/** Removes sessions that ran out. */
export function deleteExpiredSessions(db: Database, now: number): number {
  return db.delete(sessions).where(lt(sessions.expiresAt, now)).run().changes;
}
