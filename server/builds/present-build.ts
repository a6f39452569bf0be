import type { BuildSummary } from '@shared/contracts/builds';
import { isoTime } from '../iso-time';
import type { ListedBuild } from './list-builds';

/** @param unmeasuredStates required states the build was not measured in */
export function presentBuild(
  { build, hardware, firmware, commit, openDrops }: ListedBuild,
  referenceBuildId: number | null,
  unmeasuredStates: string[],
): BuildSummary {
  const { id, position, sweepCount, worstMarginDb, worstFrequencyHz, verdict } = build;
  return {
    id,
    position,
    hardware,
    firmware,
    commit,
    builtAt: isoTime(build.builtAt),
    sweepCount,
    worstMarginDb,
    worstFrequencyHz,
    verdict,
    isOverLimit: worstMarginDb !== null && worstMarginDb < 0,
    isStale: build.dataVersion > build.judgedVersion,
    isReference: id === referenceBuildId,
    openDrops,
    unmeasuredStates,
  };
}
