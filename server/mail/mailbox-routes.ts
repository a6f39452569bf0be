import { Router } from 'express';
import type { Context } from '../context';
import { actorIfAny } from '../http/actor-of';
import { pathId } from '../http/route-parameters';
import { presentMessage, presentMessageRow } from './present-message';
import { readMailbox, readMessage } from './read-mailbox';

/** The local mailbox of development and demo. */
export function mailboxRoutes(context: Context): Router {
  return Router()
    .get('/mailbox', (request, response) => {
      response.json(readMailbox(context, actorIfAny(request)).map(presentMessageRow));
    })
    .get('/mailbox/:id', async (request, response) => {
      response.json(await presentMessage(readMessage(context, actorIfAny(request), pathId(request, 'id'))));
    });
}
