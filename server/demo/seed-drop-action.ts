import { findBuildOf } from '../builds/find-build';
import type { Context } from '../context';
import { assignDrop } from '../drops/assign-drop';
import { findDropsOfBuild } from '../drops/find-drops';
import { moveDrop } from '../drops/move-drop';
import type { Product } from '../products/product-store';
import type { DropAction } from './scenario-types';
import { demoActor } from './seed-people';

/** What somebody does about the drops of a build: takes them, and moves them on with a note. */
export function seedDropAction(context: Context, product: Product, action: DropAction): void {
  const { build } = findBuildOf(context, product.id, action.build.hardware, action.build.firmware);
  const owner = demoActor(context, action.ownerEmail);
  const fixedBy =
    action.fixedBy && findBuildOf(context, product.id, action.fixedBy.hardware, action.fixedBy.firmware).build;
  const drops = findDropsOfBuild(context, build.id);
  if (drops.length === 0)
    throw new Error(`the demo scenario acts on a drop that ${action.build.firmware} does not have`);
  for (const drop of drops) {
    if (action.band !== null && drop.band !== action.band) continue;
    assignDrop(context, owner, drop.id, owner.personId);
    if (action.becomes === 'new' || action.becomes === 'withdrawn') continue;
    moveDrop(context, owner, drop.id, {
      state: action.becomes,
      note: action.note,
      ...(fixedBy !== null && { fixedByBuildId: fixedBy.id }),
    });
  }
}
