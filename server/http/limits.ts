import type { Request, RequestHandler } from 'express';
import { ipKeyGenerator, rateLimit } from 'express-rate-limit';
import type { Context } from '../context';
import { ServiceError } from '../service-error';
import { actorIfAny } from './actor-of';
import { AttemptStore } from './attempt-store';

const MINUTE_MS = 60_000;

interface Limit {
  attempts: number;
  windowMs: number;
  /** Whether attempts that succeed do not count. */
  failuresOnly: boolean;
  keyOf: (request: Request) => string;
}

/** Guessing one person's password, and trying one password on many people, from one address. */
export function throttleSignIn(context: Context): RequestHandler[] {
  return [
    throttle(context, {
      attempts: 10,
      windowMs: 15 * MINUTE_MS,
      failuresOnly: true,
      keyOf: (request) => `${addressOf(request)} ${emailOf(request)}`,
    }),
    throttle(context, { attempts: 100, windowMs: 15 * MINUTE_MS, failuresOnly: true, keyOf: addressOf }),
  ];
}

/** Filling a person's mailbox, and sending mail to many, from one address. */
export function throttleResets(context: Context): RequestHandler[] {
  return [
    throttle(context, { attempts: 5, windowMs: 60 * MINUTE_MS, failuresOnly: false, keyOf: emailOf }),
    throttle(context, { attempts: 30, windowMs: 60 * MINUTE_MS, failuresOnly: false, keyOf: addressOf }),
  ];
}

/** Mail to people outside the installation in a member's name. */
export function throttleInvitations(context: Context): RequestHandler {
  return throttle(context, { attempts: 60, windowMs: 60 * MINUTE_MS, failuresOnly: false, keyOf: senderOf });
}

/** Trying links, or the current password of an open session. */
export function throttleGuesses(context: Context): RequestHandler {
  return throttle(context, { attempts: 20, windowMs: 15 * MINUTE_MS, failuresOnly: true, keyOf: senderOf });
}

function throttle(context: Context, { attempts, windowMs, failuresOnly, keyOf }: Limit): RequestHandler {
  return rateLimit({
    windowMs,
    limit: attempts,
    skipSuccessfulRequests: failuresOnly,
    keyGenerator: keyOf,
    store: new AttemptStore(context.now),
    standardHeaders: 'draft-8',
    legacyHeaders: false,
    handler: (_request, _response, next) => {
      next(new ServiceError('throttled', `more than ${attempts} attempts in ${windowMs / MINUTE_MS} minutes; wait`));
    },
  });
}

/** An IPv6 customer holds a whole network, so its addresses count as one. */
function addressOf(request: Request): string {
  return ipKeyGenerator(request.ip ?? 'unknown');
}

function emailOf(request: Request): string {
  const email = (request.body as { email?: unknown } | undefined)?.email;
  return typeof email === 'string' ? email.trim().toLowerCase() : '';
}

function senderOf(request: Request): string {
  const actor = actorIfAny(request);
  return actor?.kind === 'person' ? `person ${actor.personId}` : addressOf(request);
}
