import { DROP_STATE_WORDS, type DropMove } from '@shared/contracts/drops';
import type { Actor } from '../actor';
import { findBuild } from '../builds/find-build';
import type { Context } from '../context';
import { withTransaction } from '../db/with-transaction';
import { buildJudgements } from '../judging/build-judgements';
import { ServiceError } from '../service-error';
import { updateDrop } from './drop-store';
import { type FixingBuild, fixFault, moveFault } from './drop-policy';
import { findDrop } from './find-drop';
import { recordDropEvent } from './record-drop-event';
import type { TracedDrop } from './trace-drop';

/**
 * Moves a drop to another state, as its state and the data allow.
 *
 * @throws ServiceError `notFound`, `forbidden`; `conflict` with the rule that does not allow it
 */
export function moveDrop(context: Context, actor: Actor, dropId: number, move: DropMove): void {
  withTransaction(context.db, () => {
    const found = findDrop(context, actor, dropId, 'drops.triage');
    const { drop } = found;
    const fault = moveFault(drop.state, move);
    if (fault !== null) throw new ServiceError('conflict', fault);
    const { state, fixedByBuildId } = move;
    const isFix = state === 'fixed' && fixedByBuildId !== undefined;
    const fix = isFix ? fixingBuild(context, found, fixedByBuildId) : null;
    const unfixed = fix && fixFault(drop, drop.evidence.witnesses, fix);
    if (unfixed) throw new ServiceError('conflict', unfixed);
    updateDrop(context.db, drop.id, {
      state,
      fixedByBuildId: isFix ? fixedByBuildId : null,
      updatedAt: context.now(),
    });
    const shown = fix ? `, shown by ${fix.name}` : '';
    const note = move.note === '' ? '.' : `: ${move.note}`;
    const text = `Moved from ${DROP_STATE_WORDS[drop.state]} to ${DROP_STATE_WORDS[state]}${shown}${note}`;
    recordDropEvent(context, actor, drop, { kind: 'moved', text }, { before: drop.state, now: state });
  });
}

function fixingBuild(context: Context, { drop, latest }: TracedDrop, buildId: number): FixingBuild {
  const { build, hardware, firmware } = findBuild(context, drop.productId, buildId);
  const lastSeen = findBuild(context, drop.productId, latest.buildId).build;
  return {
    name: `${hardware} / ${firmware}`,
    lastSeenIn: `${latest.hardware} / ${latest.firmware}`,
    isNewer: build.position > lastSeen.position,
    isStale: build.dataVersion > build.judgedVersion,
    judgements: buildJudgements(context, buildId),
  };
}
