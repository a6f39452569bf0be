import type { DigestView } from '@shared/contracts/digests';
import type { PersonActor } from '../actor';
import type { Context } from '../context';
import { isoTime, isoTimeOrNull } from '../iso-time';
import type { Team } from '../teams/team-store';
import { nextDue } from './digest-schedule';
import { countDeliveries, listDigests, listRecipients, readSetting } from './digest-store';

const SHOWN_DIGESTS = 20;

/** When a team's digest goes out, to whom, and how the last ones were delivered. */
export function viewDigest(context: Context, person: PersonActor, team: Team): DigestView {
  const { isOn, weekday, hour } = readSetting(context.db, team.id);
  const { timeZone } = team;
  const recipients = listRecipients(context.db, team.id);
  return {
    isOn,
    weekday,
    hour,
    timeZone,
    nextAt: isOn ? isoTime(nextDue(context.now(), { weekday, hour, timeZone })) : null,
    recipients: recipients.map(({ id, name, email, personId, unsubscribedAt }) => ({
      id,
      name,
      email,
      isMember: personId !== null,
      unsubscribedAt: isoTimeOrNull(unsubscribedAt),
    })),
    sent: listDigests(context.db, team.id, SHOWN_DIGESTS).map(({ id, period, subject, createdAt }) => {
      const { sent, waiting, failed } = countDeliveries(context.db, team.id, period);
      return { id, period, subject, createdAt: isoTime(createdAt), delivered: sent, waiting, failed };
    }),
    mine: recipients.some(({ email, unsubscribedAt }) => email === person.email && unsubscribedAt === null),
  };
}
