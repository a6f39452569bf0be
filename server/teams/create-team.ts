import type { TeamInput } from '@shared/contracts/teams';
import type * as z from 'zod';
import type { Actor } from '../actor';
import { recordAudit } from '../audit/record-audit';
import type { Context } from '../context';
import { withTransaction } from '../db/with-transaction';
import { ServiceError } from '../service-error';
import { insertTeam, type Team } from './team-store';

/** @throws ServiceError `conflict` when a team has this key, an archived one too */
export function createTeam(context: Context, actor: Actor, input: z.infer<typeof TeamInput>): Team {
  return withTransaction(context.db, () => {
    const team = insertTeam(context.db, { ...input, createdAt: context.now() });
    if (team === undefined) throw new ServiceError('conflict', `key: there is a team "${input.key}" already`);
    recordAudit(context, actor, {
      teamId: team.id,
      action: 'team.created',
      subjectKind: 'team',
      subjectId: team.id,
      summary: `Team ${team.key} was created`,
      details: { now: input },
    });
    return team;
  });
}
