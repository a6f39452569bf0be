import type { VerdictsView } from '@shared/contracts/judging';
import { findBuildOf } from '../builds/find-build';
import type { Context } from '../context';
import { isoTimeOrNull } from '../iso-time';
import { unmeasuredStates } from '../products/unmeasured-states';
import { listBuildsById, listReferenceChoices } from './judged-build-store';
import { listBuildIdsOfSweeps } from './judged-sweep-store';
import { referenceInForce } from './reference-in-force';
import { listNamedVerdicts } from './verdict-store';

/** The judgement of one build, band by band. @throws ServiceError `notFound` for revisions without a build */
export function viewVerdicts(
  context: Context,
  product: { id: number; key: string },
  { hardware, firmware }: { hardware: string; firmware: string },
): VerdictsView {
  const { db } = context;
  const { build } = findBuildOf(context, product.id, hardware, firmware);
  const rows = listNamedVerdicts(db, build.id);
  const referenceSweepIds = rows.flatMap(({ verdict }) => verdict.judgement.referenceSweepIds);
  const referenceBuilds = listBuildsById(db, listBuildIdsOfSweeps(db, [...new Set(referenceSweepIds)]));
  const chosenId = referenceInForce(listReferenceChoices(db, product.id), build.position);
  return {
    product: product.key,
    buildId: build.id,
    hardware,
    firmware,
    verdict: build.verdict,
    isStale: build.dataVersion > build.judgedVersion,
    judgedAt: isoTimeOrNull(build.judgedAt),
    methodVersion: rows[0]?.verdict.methodVersion ?? null,
    referenceKind: referenceBuilds.length === 0 ? null : chosenId === null ? 'pooled' : 'chosen',
    referenceBuilds: referenceBuilds.map((one) => ({ id: one.id, hardware: one.hardware, firmware: one.firmware })),
    unmeasuredStates: unmeasuredStates(context, product.id, [build.id]).get(build.id) ?? [],
    verdicts: rows.map(({ verdict: row, state }) => ({
      state,
      line: row.line,
      detector: row.detector,
      band: row.band,
      verdict: row.verdict,
      isOverLimit: row.isOverLimit,
      differenceDb: row.differenceDb,
      worstMarginDb: row.worstMarginDb,
      worstFrequencyHz: row.worstFrequencyHz,
      judgement: row.judgement,
    })),
  };
}
