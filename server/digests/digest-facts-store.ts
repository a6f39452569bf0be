import type { Detector, Line } from '@shared/detectors/detectors';
import { GUARD_CODES } from '@shared/judging/guard-hit';
import type { Verdict } from '@shared/judging/verdict';
import { and, asc, eq, gte, lt } from 'drizzle-orm';
import type { Database } from '../db/open-database';
import { builds, firmwareRevisions, hardwareRevisions, operatingStates, products, verdicts } from '../db/schema';

export interface DigestGain {
  product: string;
  hardware: string;
  firmware: string;
  state: string;
  band: string;
  differenceDb: number | null;
  marginDb: number | null;
}

/** Gains of the team's builds made between two moments, largest first in every build. */
export function listDigestGains(db: Database, teamId: number, from: number, to: number): DigestGain[] {
  return db
    .select({
      product: products.name,
      hardware: hardwareRevisions.name,
      firmware: firmwareRevisions.name,
      state: operatingStates.name,
      band: verdicts.band,
      differenceDb: verdicts.differenceDb,
      marginDb: verdicts.worstMarginDb,
    })
    .from(verdicts)
    .innerJoin(builds, eq(builds.id, verdicts.buildId))
    .innerJoin(products, eq(products.id, builds.productId))
    .innerJoin(hardwareRevisions, eq(hardwareRevisions.id, builds.hardwareId))
    .innerJoin(firmwareRevisions, eq(firmwareRevisions.id, builds.firmwareId))
    .innerJoin(operatingStates, eq(operatingStates.id, verdicts.stateId))
    .where(
      and(
        eq(products.teamId, teamId),
        eq(verdicts.verdict, 'gained'),
        gte(builds.builtAt, from),
        lt(builds.builtAt, to),
      ),
    )
    .all();
}

export interface JudgedMargin {
  buildId: number;
  stateId: number;
  state: string;
  line: Line;
  detector: Detector;
  band: string;
  verdict: Verdict;
  marginDb: number | null;
  spreadDb: number | null;
  /** A sign that the bench moved stood on the verdict. */
  isBenchSuspected: boolean;
}

/** Every judged band of a product in build order. */
export function listJudgedMargins(db: Database, productId: number): JudgedMargin[] {
  return db
    .select({
      buildId: verdicts.buildId,
      stateId: verdicts.stateId,
      state: operatingStates.name,
      line: verdicts.line,
      detector: verdicts.detector,
      band: verdicts.band,
      verdict: verdicts.verdict,
      marginDb: verdicts.worstMarginDb,
      judgement: verdicts.judgement,
    })
    .from(verdicts)
    .innerJoin(builds, eq(builds.id, verdicts.buildId))
    .innerJoin(operatingStates, eq(operatingStates.id, verdicts.stateId))
    .where(eq(builds.productId, productId))
    .orderBy(asc(builds.position))
    .all()
    .map(({ judgement, ...row }) => ({
      ...row,
      spreadDb: judgement.spread?.sdDb ?? null,
      isBenchSuspected: judgement.reasons.some(({ code }) => GUARD_CODES.some((guard) => guard === code)),
    }));
}
