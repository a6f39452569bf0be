import type { ImportPlan } from '@shared/contracts/imports';
import { SweepTags } from '@shared/contracts/sweeps';
import type { PersonActor } from '../actor';
import type { Context } from '../context';
import { withTransaction } from '../db/with-transaction';
import { ServiceError } from '../service-error';
import type { Team } from '../teams/team-store';
import { enqueueBatch } from './enqueue-batch';
import { type ImportBatch, insertBatch } from './import-store';

/** A file whose bytes are kept already. */
export interface StagedFile {
  fileName: string;
  sha256: string;
}

/**
 * Puts files that were handed over at once into the hands of the jobs process.
 *
 * @throws ServiceError `invalid` when an item names no file of the upload or its tags are not complete
 */
export function startBatch(
  context: Context,
  person: PersonActor,
  team: Team,
  plan: ImportPlan,
  files: readonly StagedFile[],
): ImportBatch {
  const items = plan.items.map(({ file, tags }) => {
    const staged = files[file];
    if (staged === undefined) {
      throw new ServiceError('invalid', `items: file ${file} is none of the ${files.length} uploaded files`);
    }
    return { fileName: staged.fileName, originalSha256: staged.sha256, tags };
  });
  requireCompleteTags(plan);
  return withTransaction(context.db, () => {
    const { personId } = person;
    const now = context.now();
    const batch = insertBatch(
      context.db,
      { teamId: team.id, createdBy: personId, createdAt: now, tags: plan.tags },
      items,
    );
    enqueueBatch(context, person, batch, 'person');
    return batch;
  });
}

function requireCompleteTags({ tags, items }: ImportPlan): void {
  const errors = items.flatMap((item, index) => {
    const issues = SweepTags.safeParse({ ...tags, ...item.tags }).error?.issues ?? [];
    return issues.map(({ path, message }) => ({ path: ['items', index, 'tags', ...path].join('.'), message }));
  });
  const [first] = errors;
  if (first !== undefined) throw new ServiceError('invalid', `${first.path}: ${first.message}`, { errors });
}
