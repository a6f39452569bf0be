import type { TokenInput } from '@shared/contracts/teams';
import type * as z from 'zod';
import type { PersonActor } from '../actor';
import { recordAudit } from '../audit/record-audit';
import type { Context } from '../context';
import { withTransaction } from '../db/with-transaction';
import { formatToken, hashSecret, newSecret } from './token-secret';
import { insertToken, type TeamToken } from './token-store';

/** Makes a team token. `written` is what its holder sends; it is not kept and cannot be shown again. */
export function createToken(
  context: Context,
  actor: PersonActor,
  teamId: number,
  { name, scopes }: z.infer<typeof TokenInput>,
): { token: TeamToken; written: string } {
  const secret = newSecret();
  return withTransaction(context.db, () => {
    const token = insertToken(context.db, {
      teamId,
      name,
      scopes: [...new Set(scopes)],
      secretHash: hashSecret(secret),
      createdBy: actor.personId,
      createdAt: context.now(),
    });
    recordAudit(context, actor, {
      teamId,
      action: 'token.created',
      subjectKind: 'token',
      subjectId: token.id,
      summary: `Token ${name} was made for ${token.scopes.join(', ')}`,
      details: { now: { name, scopes: token.scopes } },
    });
    return { token, written: formatToken(token.id, secret) };
  });
}
