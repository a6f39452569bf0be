import type { ProductSummary } from '@shared/contracts/products';
import { type ListedBuild, listBuilds } from '../builds/list-builds';
import type { Context } from '../context';
import { isoTime } from '../iso-time';
import { judgedChange } from './judged-change';
import { listChanges, type ProductOfTeam } from './product-store';
import { targetMarginOf } from './target-margin';
import { unmeasuredStates } from './unmeasured-states';

/** Builds in the small trend of an overview. */
const TREND_LENGTH = 30;

/** How a product stands now, for an overview. @param isShared owned by another team than the caller's */
export function summariseProduct(
  context: Context,
  { product, team }: ProductOfTeam,
  isShared: boolean,
): ProductSummary {
  const builds = listBuilds(context, product.id);
  const latest = builds.at(-1);
  const previous = builds.slice(0, -1).findLast(({ build }) => build.worstMarginDb !== null);
  return {
    key: product.key,
    name: product.name,
    team: team.key,
    teamName: team.name,
    isShared,
    limitSetKey: product.limitSetKey,
    targetMarginDb: targetMarginOf(product, team),
    buildCount: builds.length,
    latestBuild: latest === undefined ? null : presentLatest(context, latest),
    previousWorstMarginDb: previous?.build.worstMarginDb ?? null,
    openDrops: builds.reduce((sum, { openDrops }) => sum + openDrops, 0),
    unmeasuredStates:
      latest === undefined ? [] : (unmeasuredStates(context, product.id, [latest.build.id]).get(latest.build.id) ?? []),
    trend: builds.slice(-TREND_LENGTH).map(({ build }) => build.worstMarginDb),
  };
}

function presentLatest(context: Context, { build, hardware, firmware }: ListedBuild): ProductSummary['latestBuild'] {
  return {
    id: build.id,
    hardware,
    firmware,
    builtAt: isoTime(build.builtAt),
    worstMarginDb: build.worstMarginDb,
    worstFrequencyHz: build.worstFrequencyHz,
    verdict: build.verdict,
    changeDb: judgedChange(listChanges(context.db, build.id)),
  };
}
