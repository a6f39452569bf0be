import type { TokenActor } from '../actor';
import type { Context } from '../context';
import { ServiceError } from '../service-error';
import { teamById } from '../teams/find-team';
import { findToken, markTokenUsed } from './token-store';
import { isSecret, parseToken } from './token-secret';

/** `lastUsedAt` is written at most this often, so that a busy bench does not write with every read. */
const LAST_USE_STEP_MS = 60_000;

/** @throws ServiceError `signedOut` for a token that is malformed, unknown, wrong or revoked, or whose team is archived, alike in every case */
export function authenticateToken(context: Context, text: string): TokenActor {
  const parsed = parseToken(text);
  const token = parsed && findToken(context.db, parsed.id);
  if (
    parsed === undefined ||
    token === undefined ||
    token.revokedAt !== null ||
    !isSecret(parsed.secret, token.secretHash) ||
    teamById(context, token.teamId).isArchived
  ) {
    throw new ServiceError('signedOut', 'the team token is not valid: it is mistyped or was revoked');
  }
  const now = context.now();
  if (token.lastUsedAt === null || now - token.lastUsedAt > LAST_USE_STEP_MS) markTokenUsed(context.db, token.id, now);
  return { kind: 'token', tokenId: token.id, name: token.name, teamId: token.teamId, scopes: token.scopes };
}
