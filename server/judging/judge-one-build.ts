import type { BandJudgement } from '@shared/judging/band-judgement';
import type { BuildInput } from '@shared/judging/build-input';
import { judgeBuild } from '@shared/judging/judge-build';
import { METHOD_VERSION } from '@shared/judging/method-version';
import type { Verdict } from '@shared/judging/verdict';
import type { Actor } from '../actor';
import type { Context } from '../context';
import { withTransaction } from '../db/with-transaction';
import { settleDrops } from '../drops/settle-drops';
import { type BuildRecord, readBuildRecord } from './build-record';
import { buildVerdict } from './build-verdict';
import { dropCases } from './drop-cases';
import { type GatheredSeries, gatherSeries } from './gather-series';
import { guardSeries } from './guard-series';
import { updateJudgedBuild } from './judged-build-store';
import { markStale } from './mark-stale';
import { rejudgeNeighbours } from './rejudge-neighbours';
import { traceFacts } from './trace-facts';
import { deleteVerdicts, listVerdicts, upsertVerdict, type VerdictRow } from './verdict-store';

export const JUDGE: Actor = { kind: 'job', name: 'judge' };

export interface JudgedBuildOutcome {
  /** Null when the build has no sweeps left to judge. */
  readonly verdict: Verdict | null;
}

/**
 * Judges one build on what is stored now and settles its drops. Reading and arithmetic come first; verdicts, the build's
 * own outcome and its drops are then stored together or not at all. The same data give the same rows.
 */
export function judgeOneBuild(context: Context, buildId: number): JudgedBuildOutcome {
  const record = readBuildRecord(context, buildId);
  const { series, judgements } = judge(context, record);
  const cases = dropCases(context, record, series, judgements);
  const verdict = buildVerdict(judgements);
  return withTransaction(context.db, () => {
    const former = listVerdicts(context.db, buildId);
    const isChanged = storeVerdicts(context, buildId, former, judgements);
    updateJudgedBuild(context.db, buildId, {
      verdict,
      judgedAt: judgements.length > 0 ? context.now() : null,
      judgedVersion: record.build.dataVersion,
    });
    settleDrops(context, JUDGE, { ...record.build, product: record.product }, cases, judgements);
    // Later builds may be compared with this one: what it was judged decides whether it belongs to their reference.
    if (isChanged) markStale(context, record.product.id, record.build.position + 1);
    if (hasNewSweeps(former, judgements)) rejudgeNeighbours(context, record);
    return { verdict };
  });
}

function judge(
  context: Context,
  record: BuildRecord,
): { series: readonly GatheredSeries[]; judgements: BandJudgement[] } {
  const series = gatherSeries(record, traceFacts(context, record));
  const judgements = judgeBuild(buildInput(record, series));
  const guarded = guardSeries(context, record, series, judgements);
  return guarded ? { series: guarded, judgements: judgeBuild(buildInput(record, guarded)) } : { series, judgements };
}

function buildInput({ thresholdDb, targetMarginDb }: BuildRecord, series: readonly GatheredSeries[]): BuildInput {
  return {
    series: series.map(({ bands, ...one }) => ({ ...one, bands: bands.map(({ input }) => input) })),
    thresholdDb,
    targetMarginDb,
  };
}

/** A verdict that came out as before keeps its row and date. Returns whether any did not. */
function storeVerdicts(
  context: Context,
  buildId: number,
  former: readonly VerdictRow[],
  judgements: readonly BandJudgement[],
): boolean {
  const standing = new Map(former.map((row) => [placeKey(row), row]));
  let isChanged = false;
  for (const judgement of judgements) {
    const row = standing.get(placeKey(judgement));
    standing.delete(placeKey(judgement));
    const isSame = row?.methodVersion === METHOD_VERSION && JSON.stringify(row.judgement) === JSON.stringify(judgement);
    if (isSame) continue;
    isChanged = true;
    const { stateId, line, detector, band, verdict, overLimit, differenceDb, worst } = judgement;
    upsertVerdict(context.db, {
      buildId,
      stateId,
      line,
      detector,
      band,
      verdict,
      isOverLimit: overLimit,
      differenceDb,
      worstMarginDb: worst?.marginDb ?? null,
      worstFrequencyHz: worst?.frequencyHz ?? null,
      judgement,
      methodVersion: METHOD_VERSION,
      judgedAt: context.now(),
    });
  }
  deleteVerdicts(
    context.db,
    [...standing.values()].map(({ id }) => id),
  );
  return isChanged || standing.size > 0;
}

function placeKey({ stateId, line, detector, band }: Pick<VerdictRow, 'stateId' | 'line' | 'detector' | 'band'>) {
  return JSON.stringify([stateId, line, detector, band]);
}

function hasNewSweeps(former: readonly VerdictRow[], judgements: readonly BandJudgement[]): boolean {
  const judgedBefore = new Set(former.flatMap(({ judgement }) => judgement.buildSweepIds));
  return judgements.some(({ buildSweepIds }) => buildSweepIds.some((id) => !judgedBefore.has(id)));
}
