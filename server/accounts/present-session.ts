import type { SessionView } from '@shared/contracts/session';
import type { Actor } from '../actor';
import type { Context } from '../context';
import { demoSignIns } from '../demo/demo-sign-ins';
import { listOwnTeams } from '../teams/list-own-teams';

/** Who is signed in, their teams, and what this installation shows to everybody. */
export function presentSession(context: Context, actor: Actor | undefined): SessionView {
  const signIns = demoSignIns(context);
  const installation = {
    demo: signIns.length > 0,
    mailbox: context.config.mail.kind === 'local',
    demoSignIns: signIns,
  };
  if (actor?.kind !== 'person') return { person: null, teams: [], ...installation };
  const { personId: id, name, email, isAdministrator } = actor;
  return { person: { id, name, email, isAdministrator }, teams: listOwnTeams(context, actor), ...installation };
}
