import type { MembersView } from '@shared/contracts/teams';
import { may } from '@shared/access/may';
import type { PersonActor } from '../actor';
import type { Context } from '../context';
import { listUnanswered } from './invitation-store';
import { listMembers as listMemberRows } from './member-store';
import { presentInvitation, presentMember } from './present-member';
import type { Team } from './team-store';

/** Members of a team; open invitations only for those who manage them. */
export function listMembers(context: Context, actor: PersonActor, team: Team): MembersView {
  const manages = actor.isAdministrator || may(actor, 'members.manage', team.id);
  const unanswered = manages ? listUnanswered(context.db, team.id) : [];
  return {
    members: listMemberRows(context.db, team.id).map(presentMember),
    invitations: unanswered.map(({ invitation, invitedByName }) => presentInvitation(invitation, invitedByName)),
  };
}
