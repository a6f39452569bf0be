import type { BuildSummary, BuildView } from '@shared/contracts/builds';
import type { Context } from '../context';
import { isoTimeOrNull } from '../iso-time';
import type { Product } from '../products/product-store';
import { unmeasuredStates } from '../products/unmeasured-states';
import { ServiceError } from '../service-error';
import { type ListedBuild, listBuilds } from './list-builds';
import { presentBuild } from './present-build';
import { findFirmware, findHardware } from './revision-store';

/** Builds of a product, oldest first. */
export function viewBuilds(context: Context, product: Product): BuildSummary[] {
  const builds = listBuilds(context, product.id);
  const missing = unmeasuredStates(
    context,
    product.id,
    builds.map(({ build }) => build.id),
  );
  return builds.map((listed) => presentBuild(listed, product.referenceBuildId, missing.get(listed.build.id) ?? []));
}

/** One build with its neighbours. @throws ServiceError `notFound` when the product has no such build */
export function viewBuild(context: Context, product: Product, buildId: number): BuildView {
  const builds = listBuilds(context, product.id);
  const index = builds.findIndex(({ build }) => build.id === buildId);
  const listed = builds[index];
  if (listed === undefined) throw new ServiceError('notFound', `the product has no build number ${buildId}`);
  const { build } = listed;
  const missing = unmeasuredStates(context, product.id, [buildId]).get(buildId) ?? [];
  return {
    ...presentBuild(listed, product.referenceBuildId, missing),
    hardwareNotes: findHardware(context.db, build.hardwareId)?.notes ?? '',
    firmwareNotes: findFirmware(context.db, build.firmwareId)?.notes ?? '',
    notes: build.notes,
    switching: build.switching,
    parameters: build.parameters,
    judgedAt: isoTimeOrNull(build.judgedAt),
    previous: neighbour(builds[index - 1]),
    next: neighbour(builds[index + 1]),
  };
}

function neighbour(listed: ListedBuild | undefined): BuildView['previous'] {
  return listed === undefined ? null : { id: listed.build.id, hardware: listed.hardware, firmware: listed.firmware };
}
