import type { BandJudgement } from '@shared/judging/band-judgement';
import * as z from 'zod';
import { DetectorName, Line, VerdictName } from './primitives';

/** Query of the verdicts of one build. */
export const BuildQuery = z.object({ hardware: z.string(), firmware: z.string() });
/** POST /api/v1/products/:key/evaluate?wait: 202 with the run, or 200 with the run at its end */
export const EvaluateQuery = z.object({ wait: z.enum(['true', 'false']).default('false') });

/** GET /api/v1/products/:key/verdicts?hardware&firmware */
export const VerdictsView = z
  .object({
    product: z.string(),
    buildId: z.int(),
    hardware: z.string(),
    firmware: z.string(),
    verdict: VerdictName.nullable(),
    isStale: z.boolean(),
    judgedAt: z.string().nullable(),
    methodVersion: z.int().nullable(),
    referenceKind: z.enum(['chosen', 'pooled']).nullable(),
    referenceBuilds: z.array(z.object({ id: z.int(), hardware: z.string(), firmware: z.string() })),
    unmeasuredStates: z.array(z.string()),
    verdicts: z.array(
      z.object({
        state: z.string(),
        line: Line,
        detector: DetectorName,
        band: z.string(),
        verdict: VerdictName,
        isOverLimit: z.boolean(),
        differenceDb: z.number().nullable(),
        worstMarginDb: z.number().nullable(),
        worstFrequencyHz: z.number().nullable(),
        judgement: z
          .custom<BandJudgement>()
          .meta({ type: 'object', description: 'the comparison with all its figures' }),
      }),
    ),
  })
  .meta({ id: 'Verdicts' });
export type VerdictsView = z.infer<typeof VerdictsView>;

/** GET /api/v1/products/:key/gate?hardware&firmware&targetMarginDb&format */
export const GateQuery = BuildQuery.extend({
  targetMarginDb: z.coerce.number().min(0).max(40).optional(),
  format: z.enum(['json', 'junit']).default('json'),
});
export const GateView = z
  .object({
    verdict: z.enum(['pass', 'fail', 'incomplete']),
    product: z.string(),
    hardware: z.string(),
    firmware: z.string(),
    targetMarginDb: z.number(),
    reasons: z.array(z.object({ code: z.string(), text: z.string() })),
  })
  .meta({ id: 'Gate' });
export type GateView = z.infer<typeof GateView>;
