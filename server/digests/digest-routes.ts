import { DigestMine, DigestPatch, DigestRecipientInput } from '@shared/contracts/digests';
import type { Action } from '@shared/access/permissions';
import { type Request, Router } from 'express';
import type { Context } from '../context';
import { personOf } from '../http/actor-of';
import { pathId, pathText } from '../http/route-parameters';
import { presentRun } from '../queue/present-run';
import { findTeam } from '../teams/find-team';
import { addRecipient, editDigest, removeRecipient, setOwnDigest, unsubscribe } from './edit-digest';
import { requestDigestNow } from './request-digests';
import { viewDigest } from './view-digest';

/** Digest settings and recipients of a team. */
export function digestRoutes(context: Context): Router {
  const team = (request: Request, action: Action) =>
    findTeam(context, personOf(request), pathText(request, 'team'), action);

  return Router()
    .get('/teams/:team/digest', (request, response) => {
      response.json(viewDigest(context, personOf(request), team(request, 'results.read')));
    })
    .patch('/teams/:team/digest', (request, response) => {
      const found = team(request, 'digests.manage');
      editDigest(context, personOf(request), found, DigestPatch.parse(request.body));
      response.json(viewDigest(context, personOf(request), found));
    })
    .post('/teams/:team/digest/recipients', (request, response) => {
      const found = team(request, 'digests.manage');
      addRecipient(context, personOf(request), found, DigestRecipientInput.parse(request.body));
      response.status(201).json(viewDigest(context, personOf(request), found));
    })
    .delete('/teams/:team/digest/recipients/:recipient', (request, response) => {
      const found = team(request, 'digests.manage');
      removeRecipient(context, personOf(request), found, pathId(request, 'recipient'));
      response.status(204).end();
    })
    .put('/teams/:team/digest/mine', (request, response) => {
      const found = team(request, 'results.read');
      setOwnDigest(context, personOf(request), found, DigestMine.parse(request.body).isOn);
      response.json(viewDigest(context, personOf(request), found));
    })
    .post('/teams/:team/digest/now', (request, response) => {
      const found = team(request, 'results.read');
      response.status(202).json(presentRun(requestDigestNow(context, personOf(request), found.id)));
    });
}

/**
 * Where a mail program or the unsubscribe page posts to. Mounted before the sign-in and its cross-site guard: the secret
 * in the address is the right to do it, and the mail program of RFC 8058 has no cookie.
 */
export function unsubscribeRoutes(context: Context): Router {
  return Router().post('/digest/unsubscribe/:secret', (request, response) => {
    unsubscribe(context, pathText(request, 'secret'));
    response.json({ isUnsubscribed: true });
  });
}
