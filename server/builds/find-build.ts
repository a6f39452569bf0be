import type { Context } from '../context';
import { ServiceError } from '../service-error';
import { findBuildByRevisions, findNamedBuild, type NamedBuild } from './build-store';

/** @throws ServiceError `notFound` when the product has no such build */
export function findBuild(context: Context, productId: number, buildId: number): NamedBuild {
  const found = findNamedBuild(context.db, productId, buildId);
  if (found === undefined) throw new ServiceError('notFound', `the product has no build number ${buildId}`);
  return found;
}

/** @throws ServiceError `notFound` when the product has no build of these revisions */
export function findBuildOf(context: Context, productId: number, hardware: string, firmware: string): NamedBuild {
  const found = findBuildByRevisions(context.db, productId, hardware, firmware);
  if (found === undefined) {
    throw new ServiceError(
      'notFound',
      `the product has no build with hardware "${hardware}" and firmware "${firmware}"`,
    );
  }
  return found;
}
