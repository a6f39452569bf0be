import { MAX_HISTORY_BUILDS } from '@shared/judging/choose-reference';
import type { Context } from '../context';
import { productById } from '../products/find-product';
import { targetMarginOf } from '../products/target-margin';
import { teamById } from '../teams/find-team';
import {
  findJudgedBuild,
  type JudgedBuild,
  listBuildsById,
  listMeasuredBefore,
  listReferenceChoices,
} from './judged-build-store';
import { type JudgedSweep, listJudgedSweeps } from './judged-sweep-store';
import { referenceInForce } from './reference-in-force';
import { type EarlierVerdict, listEarlierVerdicts } from './verdict-store';

/** Earlier builds looked at: not every build measures every series, so more than a spread is taken from. */
const EARLIER_BUILDS = 3 * MAX_HISTORY_BUILDS;

/** All that is stored of a build and of those before it, as far as its judgement needs it. */
export interface BuildRecord {
  readonly build: JudgedBuild;
  readonly product: ReturnType<typeof productById>;
  readonly team: ReturnType<typeof teamById>;
  readonly targetMarginDb: number;
  readonly thresholdDb: number;
  /** Measured builds before it, oldest first, the chosen reference among them. */
  readonly earlier: readonly JudgedBuild[];
  readonly chosenBuildId: number | null;
  /** Product sweeps of the build. */
  readonly sweeps: readonly JudgedSweep[];
  /** Product sweeps of the earlier builds in the states the build was measured in. */
  readonly earlierSweeps: readonly JudgedSweep[];
  readonly earlierVerdicts: readonly EarlierVerdict[];
}

/** @throws Error when the build is gone */
export function readBuildRecord(context: Context, buildId: number): BuildRecord {
  const { db } = context;
  // First of all, so that data coming in while the rest is read leaves the build stale.
  const build = findJudgedBuild(db, buildId);
  if (build === undefined) throw new Error(`build ${buildId} is gone`);
  const product = productById(context, build.productId);
  const team = teamById(context, product.teamId);
  const chosenBuildId = referenceInForce(listReferenceChoices(db, product.id), build.position);
  const earlier = withChosen(
    context,
    listMeasuredBefore(db, product.id, build.position, EARLIER_BUILDS),
    chosenBuildId,
  );
  const earlierIds = earlier.map(({ id }) => id);
  const sweeps = listJudgedSweeps(db, [build.id]);
  const stateIds = [...new Set(sweeps.map(({ stateId }) => stateId))];
  return {
    build,
    product,
    team,
    targetMarginDb: targetMarginOf(product, team),
    thresholdDb: team.thresholdDb,
    earlier,
    chosenBuildId,
    sweeps,
    earlierSweeps: listJudgedSweeps(db, earlierIds, stateIds),
    earlierVerdicts: listEarlierVerdicts(db, earlierIds, stateIds),
  };
}

/** A chosen reference serves however old it is. */
function withChosen(context: Context, latest: readonly JudgedBuild[], chosenBuildId: number | null): JudgedBuild[] {
  const isAmong = chosenBuildId === null || latest.some(({ id }) => id === chosenBuildId);
  return isAmong ? [...latest] : [...listBuildsById(context.db, [chosenBuildId]), ...latest];
}
