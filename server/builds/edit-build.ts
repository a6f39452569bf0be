import type { BuildInput, BuildPatch } from '@shared/contracts/builds';
import type * as z from 'zod';
import type { Actor } from '../actor';
import { recordAudit } from '../audit/record-audit';
import type { Context } from '../context';
import { withTransaction } from '../db/with-transaction';
import { markStale } from '../judging/mark-stale';
import type { Product } from '../products/product-store';
import { ServiceError } from '../service-error';
import {
  type Build,
  findBuildByRevisions,
  positionFor,
  removePosition,
  shiftPositions,
  updateBuild,
  updateLatestBuild,
} from './build-store';
import { findBuild } from './find-build';
import { findOrCreateBuild } from './find-or-create-build';
import { updateFirmware, updateHardware } from './revision-store';

type Patch = z.infer<typeof BuildPatch>;

/** @throws ServiceError `conflict` when the product has a build of these revisions */
export function createBuild(context: Context, actor: Actor, product: Product, input: BuildInput): Build {
  const { hardware, firmware, ...details } = input;
  return withTransaction(context.db, () => {
    if (findBuildByRevisions(context.db, product.id, hardware, firmware) !== undefined) {
      throw new ServiceError(
        'conflict',
        `the product has a build with hardware "${hardware}" and firmware "${firmware}" already`,
      );
    }
    const build = findOrCreateBuild(context, actor, product, {
      hardware,
      firmware,
      builtAt: Date.parse(input.builtAt),
    });
    return applyPatch(context, product, build, details);
  });
}

/** Changes what is known of a build; a new date moves it to its place, and builds from there on are judged anew. */
export function editBuild(context: Context, actor: Actor, product: Product, buildId: number, patch: Patch): Build {
  return withTransaction(context.db, () => {
    const { build: before, hardware, firmware } = findBuild(context, product.id, buildId);
    if (Object.keys(patch).length === 0) return before;
    const build = applyPatch(context, product, before, patch);
    recordAudit(context, actor, {
      teamId: product.teamId,
      action: 'build.changed',
      subjectKind: 'build',
      subjectId: buildId,
      summary: `Build ${hardware} / ${firmware} of ${product.key} was changed`,
      details: {
        before: {
          builtAt: before.builtAt,
          notes: before.notes,
          switching: before.switching,
          parameters: before.parameters,
        },
        now: patch,
      },
    });
    return build;
  });
}

function applyPatch(context: Context, product: Product, before: Build, patch: Patch): Build {
  const { db } = context;
  const { hardwareNotes, firmwareNotes, commit, builtAt, ...own } = patch;
  if (hardwareNotes !== undefined) updateHardware(db, before.hardwareId, { notes: hardwareNotes });
  if (firmwareNotes !== undefined || commit !== undefined) {
    updateFirmware(db, before.firmwareId, {
      ...(firmwareNotes !== undefined && { notes: firmwareNotes }),
      ...(commit !== undefined && { commit }),
    });
  }
  const moved = builtAt === undefined ? before : moveTo(context, product, before, Date.parse(builtAt));
  const build = Object.keys(own).length > 0 ? updateBuild(db, before.id, own) : moved;
  // The switching frequencies and parameters stand in the evidence of drops, the order decides the reference.
  markStale(context, product.id, Math.min(before.position, build.position));
  return build;
}

function moveTo(context: Context, product: Product, build: Build, builtAt: number): Build {
  const { db } = context;
  removePosition(db, product.id, build);
  const position = positionFor(db, product.id, builtAt);
  shiftPositions(db, product.id, position);
  const moved = updateBuild(db, build.id, { builtAt, position });
  updateLatestBuild(db, product.id);
  return moved;
}
