import { TeamPatch } from '@shared/contracts/teams';
import { Router } from 'express';
import type { Context } from '../context';
import { actorOf } from '../http/actor-of';
import { pathText } from '../http/route-parameters';
import { editTeam } from './edit-team';
import { findTeam } from './find-team';
import { invitationRoutes } from './invitation-routes';
import { memberRoutes } from './member-routes';
import { presentTeam } from './present-team';

/** A team, its members and invitations. */
export function teamRoutes(context: Context): Router {
  return Router()
    .get('/teams/:team', (request, response) => {
      response.json(presentTeam(findTeam(context, actorOf(request), pathText(request, 'team'), 'results.read')));
    })
    .patch('/teams/:team', (request, response) => {
      const actor = actorOf(request);
      const team = findTeam(context, actor, pathText(request, 'team'), 'team.edit');
      response.json(presentTeam(editTeam(context, actor, team, TeamPatch.parse(request.body))));
    })
    .use(memberRoutes(context), invitationRoutes(context));
}
