import type { PersonActor } from '../actor';
import type { Context } from '../context';
import { enqueueRun } from '../queue/enqueue-run';
import type { JobRun } from '../queue/run-store';
import { newSecret } from '../tokens/token-secret';
import type { DigestOrder } from './digest-order';
import { isoWeek, lastDue } from './digest-schedule';
import { listDigestTeams, listRecipients, readSetting, upsertRecipient } from './digest-store';

const JOB = { kind: 'job', name: 'digest' } as const;
/** A digest missed by more than this, the process having been down, is not sent late. */
const STALE_AFTER_MS = 3 * 24 * 3600_000;

/** Asks for the digest of every team whose hour has come; the once-key makes it one a team and week. */
export function requestDueDigests(context: Context, trigger: 'schedule' | 'start'): void {
  const now = context.now();
  for (const team of listDigestTeams(context.db)) {
    const setting = readSetting(context.db, team.id);
    const dueAt = lastDue(now, { ...setting, timeZone: team.timeZone });
    const isWanted = setting.isOn && now - dueAt < STALE_AFTER_MS && dueAt >= team.createdAt;
    if (!isWanted) continue;
    enqueueRun(context, JOB, {
      job: 'digest',
      teamId: team.id,
      payload: { teamId: team.id, dueAt } satisfies DigestOrder,
      lockKey: `digest:${team.id}`,
      onceKey: `digest:${team.id}:${isoWeek(dueAt, team.timeZone)}`,
      trigger,
    });
  }
}

/** Asks for a digest of the last seven days for the asking person alone, who gets the weekly one as before or not. */
export function requestDigestNow(context: Context, person: PersonActor, teamId: number): JobRun {
  const { personId, email, name } = person;
  const recipient =
    listRecipients(context.db, teamId).find((one) => one.email === email) ??
    upsertRecipient(context.db, {
      teamId,
      personId,
      email,
      name,
      unsubscribeSecret: newSecret(),
      createdAt: context.now(),
      unsubscribedAt: context.now(),
    });
  return enqueueRun(context, person, {
    job: 'digest',
    teamId,
    payload: { teamId, dueAt: context.now(), onlyRecipientId: recipient.id } satisfies DigestOrder,
    lockKey: `digest:${teamId}:now:${recipient.id}`,
    trigger: 'person',
  });
}
