import { SignIn } from '@shared/contracts/session';
import { type RequestHandler, Router } from 'express';
import passport from 'passport';
import type { Context } from '../context';
import { actorIfAny, personOf } from '../http/actor-of';
import { issueCrossSiteToken } from '../http/cross-site';
import { throttleSignIn } from '../http/limits';
import { endSessionsOf } from '../http/session-store';
import { ServiceError } from '../service-error';
import { presentSession } from './present-session';
import { endSession, startSession } from '../http/session-of-request';
import { signInStrategy } from './sign-in-strategy';

/** Signing in and out. */
export function sessionRoutes(context: Context): Router {
  return Router()
    .get('/csrf', (request, response) => {
      issueCrossSiteToken(request, response);
      response.sendStatus(204);
    })
    .get('/session', (request, response) => {
      response.set('cache-control', 'no-store').json(presentSession(context, actorIfAny(request)));
    })
    .post('/session', readSignIn, ...throttleSignIn(context), checkPassword(context), async (request, response) => {
      const personId = request.user?.personId;
      if (personId === undefined) throw new ServiceError('signedOut', 'e-mail and password do not fit together');
      await startSession(request, response, personId);
      response.sendStatus(204);
    })
    .delete('/session', async (request, response) => {
      await endSession(request, response);
      response.sendStatus(204);
    })
    .delete('/session/everywhere', async (request, response) => {
      const { personId } = personOf(request);
      await endSession(request, response);
      endSessionsOf(context.db, personId);
      response.sendStatus(204);
    });
}

const readSignIn: RequestHandler = (request, _response, next) => {
  request.body = SignIn.parse(request.body);
  next();
};

/** Leaves `request.user` to the handler: the person of the password, or nobody, whoever was signed in before. */
function checkPassword(context: Context): RequestHandler {
  const strategy = signInStrategy(context);
  return (request, response, next) => {
    const decide = (error: unknown, user?: Express.User | false): void => {
      request.user = user || undefined;
      next(error ?? undefined);
    };
    (passport.authenticate(strategy, decide) as RequestHandler)(request, response, next);
  };
}
