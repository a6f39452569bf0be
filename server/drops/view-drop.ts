import { may } from '@shared/access/may';
import type { DropView } from '@shared/contracts/drops';
import type { Actor } from '../actor';
import { findBuild } from '../builds/find-build';
import type { Context } from '../context';
import { assignableMembers } from './assign-drop';
import { movesFrom } from './drop-policy';
import { listDropEvents } from './drop-store';
import { findDrop } from './find-drop';
import { presentDrop } from './present-drop';

/** A drop with its evidence, its history and what the actor may do with it. @throws ServiceError `notFound` */
export function viewDrop(context: Context, actor: Actor, dropId: number): DropView {
  const found = findDrop(context, actor, dropId, 'results.read');
  const { drop } = found;
  const mayTriage = may(actor, 'drops.triage', drop.teamId);
  const fixing = drop.fixedByBuildId === null ? null : findBuild(context, drop.productId, drop.fixedByBuildId);
  return presentDrop(found, {
    events: listDropEvents(context.db, drop.id),
    fixedBy: fixing && { id: fixing.build.id, hardware: fixing.hardware, firmware: fixing.firmware },
    moves: mayTriage ? [...movesFrom(drop.state)] : [],
    assignable: mayTriage ? assignableMembers(context, drop.teamId).map(({ id, name }) => ({ id, name })) : [],
  });
}
