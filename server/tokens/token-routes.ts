import { TokenInput } from '@shared/contracts/teams';
import { Router } from 'express';
import type { Context } from '../context';
import { personOf } from '../http/actor-of';
import { pathId, pathText } from '../http/route-parameters';
import { findTeam } from '../teams/find-team';
import { createToken } from './create-token';
import { listTokens } from './list-tokens';
import { presentToken } from './present-token';
import { revokeToken } from './revoke-token';

/** Team tokens. */
export function tokenRoutes(context: Context): Router {
  return Router()
    .get('/teams/:team/tokens', (request, response) => {
      const team = findTeam(context, personOf(request), pathText(request, 'team'), 'tokens.manage');
      response.json(listTokens(context, team.id));
    })
    .post('/teams/:team/tokens', (request, response) => {
      const actor = personOf(request);
      const team = findTeam(context, actor, pathText(request, 'team'), 'tokens.manage');
      const { token, written } = createToken(context, actor, team.id, TokenInput.parse(request.body));
      response
        .status(201)
        .set('cache-control', 'no-store')
        .json({ ...presentToken(token, actor.name), token: written });
    })
    .delete('/teams/:team/tokens/:id', (request, response) => {
      const actor = personOf(request);
      const team = findTeam(context, actor, pathText(request, 'team'), 'tokens.manage');
      revokeToken(context, actor, team.id, pathId(request, 'id'));
      response.sendStatus(204);
    });
}
