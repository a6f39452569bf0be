import { RoleChange } from '@shared/contracts/teams';
import { Router } from 'express';
import type { PersonActor } from '../actor';
import type { Context } from '../context';
import { personOf } from '../http/actor-of';
import { pathId, pathText } from '../http/route-parameters';
import { changeRole } from './change-role';
import { findManagedTeam } from './find-managed-team';
import { findTeam } from './find-team';
import { listMembers } from './list-members';
import { removeMember } from './remove-member';
import type { Team } from './team-store';

/** Who is in a team, as what. */
export function memberRoutes(context: Context): Router {
  return Router()
    .get('/teams/:team/members', (request, response) => {
      const actor = personOf(request);
      response.json(listMembers(context, actor, readableTeam(context, actor, pathText(request, 'team'))));
    })
    .patch('/teams/:team/members/:personId', (request, response) => {
      const actor = personOf(request);
      const team = findManagedTeam(context, actor, pathText(request, 'team'));
      changeRole(context, actor, team, pathId(request, 'personId'), RoleChange.parse(request.body).role);
      response.sendStatus(204);
    })
    .delete('/teams/:team/members/:personId', (request, response) => {
      const actor = personOf(request);
      const team = findManagedTeam(context, actor, pathText(request, 'team'));
      removeMember(context, actor, team, pathId(request, 'personId'));
      response.sendStatus(204);
    });
}

function readableTeam(context: Context, actor: PersonActor, key: string): Team {
  return actor.isAdministrator ? findManagedTeam(context, actor, key) : findTeam(context, actor, key, 'results.read');
}
