import type { TokenView } from '@shared/contracts/teams';
import type { Context } from '../context';
import { presentToken } from './present-token';
import { listTokenRows } from './token-store';

/** Tokens of a team, those in force first, then newest first. */
export function listTokens(context: Context, teamId: number): TokenView[] {
  return listTokenRows(context.db, teamId).map(({ token, createdByName }) => presentToken(token, createdByName));
}
