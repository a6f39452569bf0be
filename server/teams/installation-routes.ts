import { PersonPatch, RoleChange, TeamArchive, TeamInput } from '@shared/contracts/teams';
import { type Request, Router } from 'express';
import { editPerson } from '../accounts/edit-person';
import { listPeople } from '../accounts/list-people';
import type { Context } from '../context';
import { actorOf } from '../http/actor-of';
import { pathId, pathText } from '../http/route-parameters';
import { requireAdministrator } from '../require-permission';
import { archiveTeam } from './archive-team';
import { createTeam } from './create-team';
import { findManagedTeam } from './find-managed-team';
import { describeTeam, listTeams } from './list-teams';
import { removeMember } from './remove-member';
import { setMembership } from './set-membership';

const administratorOf = (request: Request) => requireAdministrator(actorOf(request));

/** Teams and people of the installation, for administrators. */
export function installationRoutes(context: Context): Router {
  return Router()
    .get('/installation/teams', (request, response) => {
      administratorOf(request);
      response.json(listTeams(context));
    })
    .post('/installation/teams', (request, response) => {
      const team = createTeam(context, administratorOf(request), TeamInput.parse(request.body));
      response.status(201).json(describeTeam(context, team));
    })
    .patch('/installation/teams/:team', (request, response) => {
      const actor = administratorOf(request);
      const { isArchived } = TeamArchive.parse(request.body);
      response.json(describeTeam(context, archiveTeam(context, actor, pathText(request, 'team'), isArchived)));
    })
    .get('/installation/people', (request, response) => {
      administratorOf(request);
      response.json(listPeople(context));
    })
    .patch('/installation/people/:id', (request, response) => {
      const actor = administratorOf(request);
      editPerson(context, actor, pathId(request, 'id'), PersonPatch.parse(request.body));
      response.sendStatus(204);
    })
    .put('/installation/people/:id/memberships/:team', (request, response) => {
      const actor = administratorOf(request);
      const team = findManagedTeam(context, actor, pathText(request, 'team'));
      setMembership(context, actor, team, pathId(request, 'id'), RoleChange.parse(request.body).role);
      response.sendStatus(204);
    })
    .delete('/installation/people/:id/memberships/:team', (request, response) => {
      const actor = administratorOf(request);
      const team = findManagedTeam(context, actor, pathText(request, 'team'));
      removeMember(context, actor, team, pathId(request, 'id'));
      response.sendStatus(204);
    });
}
