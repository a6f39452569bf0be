import type { SwitchingStage } from '@shared/contracts/switching';
import type { Actor } from '../actor';
import { recordAudit } from '../audit/record-audit';
import type { Context } from '../context';
import { withTransaction } from '../db/with-transaction';
import type { Product } from '../products/product-store';
import {
  type Build,
  findBuildByRevisions,
  insertBuild,
  positionFor,
  shiftPositions,
  updateLatestBuild,
} from './build-store';
import { findOrInsertRevision } from './revision-store';

export interface WantedBuild {
  hardware: string;
  firmware: string;
  /** When it was built, UTC milliseconds; for a build that first shows in a sweep, when that was taken. */
  builtAt: number;
  switching?: SwitchingStage[];
}

/**
 * The build of this pair of revisions. A new one takes its place among the others by its date, revisions that do not
 * exist yet are made, and the product's pointer to its newest build follows.
 */
export function findOrCreateBuild(context: Context, actor: Actor, product: Product, wanted: WantedBuild): Build {
  const { db } = context;
  return withTransaction(db, () => {
    const found = findBuildByRevisions(db, product.id, wanted.hardware, wanted.firmware);
    if (found) return found.build;
    const now = context.now();
    const position = positionFor(db, product.id, wanted.builtAt);
    shiftPositions(db, product.id, position);
    const build = insertBuild(db, {
      productId: product.id,
      hardwareId: findOrInsertRevision(db, 'hardware', product.id, wanted.hardware, now),
      firmwareId: findOrInsertRevision(db, 'firmware', product.id, wanted.firmware, now),
      position,
      builtAt: wanted.builtAt,
      switching: wanted.switching ?? [],
      createdAt: now,
    });
    updateLatestBuild(db, product.id);
    recordAudit(context, actor, {
      teamId: product.teamId,
      action: 'build.created',
      subjectKind: 'build',
      subjectId: build.id,
      summary: `Build ${wanted.hardware} / ${wanted.firmware} of ${product.key} appeared`,
    });
    return build;
  });
}
