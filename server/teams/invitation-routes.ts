import { InvitationAnswer } from '@shared/contracts/session';
import { InvitationInput } from '@shared/contracts/teams';
import { Router } from 'express';
import { startSession } from '../http/session-of-request';
import type { Context } from '../context';
import { personOf } from '../http/actor-of';
import { throttleGuesses, throttleInvitations } from '../http/limits';
import { pathId, pathText } from '../http/route-parameters';
import { acceptInvitation } from './accept-invitation';
import { findManagedTeam } from './find-managed-team';
import { inviteMember } from './invite-member';
import { viewInvitation } from './open-invitation';
import { presentInvitation } from './present-member';
import { resendInvitation } from './resend-invitation';
import { revokeInvitation } from './revoke-invitation';

/** Inviting people, and answering an invitation. */
export function invitationRoutes(context: Context): Router {
  const throttleSending = throttleInvitations(context);
  const throttleOpening = throttleGuesses(context);
  return Router()
    .post('/teams/:team/invitations', throttleSending, (request, response) => {
      const actor = personOf(request);
      const team = findManagedTeam(context, actor, pathText(request, 'team'));
      const invitation = inviteMember(context, actor, team, InvitationInput.parse(request.body));
      response.status(201).json(presentInvitation(invitation, actor.name));
    })
    .post('/teams/:team/invitations/:id/resend', throttleSending, (request, response) => {
      const actor = personOf(request);
      const team = findManagedTeam(context, actor, pathText(request, 'team'));
      resendInvitation(context, actor, team, pathId(request, 'id'));
      response.sendStatus(204);
    })
    .delete('/teams/:team/invitations/:id', (request, response) => {
      const actor = personOf(request);
      const team = findManagedTeam(context, actor, pathText(request, 'team'));
      revokeInvitation(context, actor, team, pathId(request, 'id'));
      response.sendStatus(204);
    })
    .get('/invitations/:token', throttleOpening, (request, response) => {
      response.json(viewInvitation(context, pathText(request, 'token')));
    })
    .post('/invitations/:token', throttleOpening, async (request, response) => {
      const answer = InvitationAnswer.parse(request.body);
      const newcomer = await acceptInvitation(context, pathText(request, 'token'), answer);
      if (newcomer !== undefined) await startSession(request, response, newcomer);
      response.sendStatus(204);
    });
}
