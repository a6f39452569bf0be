import type { TokenView } from '@shared/contracts/teams';
import { isoTime, isoTimeOrNull } from '../iso-time';
import type { TeamToken } from './token-store';

export function presentToken(token: TeamToken, createdBy: string): TokenView {
  const { id, name, scopes, createdAt, lastUsedAt, revokedAt } = token;
  return {
    id,
    name,
    scopes,
    createdBy,
    createdAt: isoTime(createdAt),
    lastUsedAt: isoTimeOrNull(lastUsedAt),
    revokedAt: isoTimeOrNull(revokedAt),
  };
}
