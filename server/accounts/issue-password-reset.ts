import type { Context } from '../context';
import { hashSecret, newSecret } from '../tokens/token-secret';
import { insertReset } from './password-reset-store';

/** Makes a link with which the person can set a password once, until `validMs` from now. */
export function issuePasswordReset(
  context: Context,
  personId: number,
  validMs: number,
): { resetId: number; url: string } {
  const secret = newSecret();
  const createdAt = context.now();
  const { id } = insertReset(context.db, {
    personId,
    tokenHash: hashSecret(secret),
    createdAt,
    expiresAt: createdAt + validMs,
  });
  return { resetId: id, url: `${context.config.publicUrl}/reset/${secret}` };
}
