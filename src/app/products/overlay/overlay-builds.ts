import type { BuildSummary } from '@shared/contracts/builds';

/** Builds of a picture with the one in question, the newest that was measured. */
export interface OverlayBuilds {
  chosen: readonly BuildSummary[];
  lead: BuildSummary | undefined;
}

/** The newest measured build, the reference and the measured build before the newest. */
export function defaultBuilds(builds: readonly BuildSummary[]): BuildSummary[] {
  const measured = builds.filter(({ sweepCount }) => sweepCount > 0);
  const picked = [measured.at(-1), measured.find(({ isReference }) => isReference), measured.at(-2)];
  return [...new Set(picked)].filter((build) => build !== undefined);
}

/** The builds an address asks for in its order, or the default ones; ids the product does not have are left out. */
export function overlayBuilds(builds: readonly BuildSummary[], ids: readonly number[] | undefined): OverlayBuilds {
  const chosen =
    ids === undefined
      ? defaultBuilds(builds)
      : ids.map((id) => builds.find((build) => build.id === id)).filter((build) => build !== undefined);
  const lead = [...chosen].sort((a, b) => b.position - a.position).find(({ sweepCount }) => sweepCount > 0);
  return { chosen, lead };
}
