import type { Actor } from '../actor';
import { recordAudit } from '../audit/record-audit';
import type { Context } from '../context';
import { withTransaction } from '../db/with-transaction';
import { ServiceError } from '../service-error';
import { findToken, markTokenRevoked } from './token-store';

/** Ends a team token for good; once revoked it stays revoked. @throws ServiceError `notFound` for one of another team */
export function revokeToken(context: Context, actor: Actor, teamId: number, id: number): void {
  withTransaction(context.db, () => {
    const token = findToken(context.db, id);
    if (token === undefined || token.teamId !== teamId)
      throw new ServiceError('notFound', `the team has no token ${id}`);
    if (token.revokedAt !== null) return;
    markTokenRevoked(context.db, id, context.now());
    recordAudit(context, actor, {
      teamId,
      action: 'token.revoked',
      subjectKind: 'token',
      subjectId: id,
      summary: `Token ${token.name} was revoked`,
      details: { before: { name: token.name, scopes: token.scopes } },
    });
  });
}
