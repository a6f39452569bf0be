import type { TeamPatch } from '@shared/contracts/teams';
import type { Actor } from '../actor';
import { recordAudit } from '../audit/record-audit';
import type { Context } from '../context';
import { withTransaction } from '../db/with-transaction';
import { markStale } from '../judging/mark-stale';
import { requestRemeasure } from '../sweeps/request-remeasure';
import { presentTeam } from './present-team';
import { listProductIds, type Team, updateTeam } from './team-store';

/**
 * Changes a team's settings. Builds are judged again where the change bears on a verdict; sweeps are measured again when
 * the bands are other ones.
 */
export function editTeam(context: Context, actor: Actor, team: Team, patch: TeamPatch): Team {
  if (Object.keys(patch).length === 0) return team;
  return withTransaction(context.db, () => {
    const changed = updateTeam(context.db, team.id, patch);
    const hasOtherBands = JSON.stringify(changed.bands) !== JSON.stringify(team.bands);
    const isJudgedAnew =
      changed.thresholdDb !== team.thresholdDb || changed.targetMarginDb !== team.targetMarginDb || hasOtherBands;
    if (isJudgedAnew) for (const productId of listProductIds(context.db, team.id)) markStale(context, productId, 0);
    if (hasOtherBands) requestRemeasure(context, actor, team.id, 'person');
    recordAudit(context, actor, {
      teamId: team.id,
      action: 'team.changed',
      subjectKind: 'team',
      subjectId: team.id,
      summary: `Settings of ${team.key} were changed: ${Object.keys(patch).join(', ')}`,
      details: { before: valuesNamedIn(patch, team), now: patch },
    });
    return changed;
  });
}

function valuesNamedIn(patch: TeamPatch, team: Team): Record<string, unknown> {
  return Object.fromEntries(Object.entries(presentTeam(team)).filter(([name]) => name in patch));
}
