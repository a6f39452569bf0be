import { NewPassword, PasswordChange, ResetRequest } from '@shared/contracts/session';
import { Router } from 'express';
import type { Context } from '../context';
import { personOf } from '../http/actor-of';
import { throttleGuesses, throttleResets } from '../http/limits';
import { pathText } from '../http/route-parameters';
import { changePassword } from './change-password';
import { requestPasswordReset } from './request-password-reset';
import { resetPassword } from './reset-password';
import { endSession, startSession } from '../http/session-of-request';

/** Changing a password, and setting a new one by e-mail. */
export function passwordRoutes(context: Context): Router {
  return Router()
    .post('/account/password', throttleGuesses(context), async (request, response) => {
      const actor = personOf(request);
      await changePassword(context, actor, PasswordChange.parse(request.body));
      await startSession(request, response, actor.personId);
      response.sendStatus(204);
    })
    .post('/password-resets', ...throttleResets(context), (request, response) => {
      requestPasswordReset(context, ResetRequest.parse(request.body).email);
      response.sendStatus(202);
    })
    .post('/password-resets/:token', throttleGuesses(context), async (request, response) => {
      await resetPassword(context, pathText(request, 'token'), NewPassword.parse(request.body).password);
      await endSession(request, response);
      response.sendStatus(204);
    });
}
