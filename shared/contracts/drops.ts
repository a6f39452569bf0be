import type { BandJudgement } from '@shared/judging/band-judgement';
import * as z from 'zod';
import { DROP_STATES, OPEN_DROP_STATES } from './drop-states';
import { Remark } from './sweeps';
import { SwitchingStage } from './switching';

/** Apart, so that pages take states and words without the schemas. */
export { DROP_STATE_WORDS, DROP_STATES, type DropState, OPEN_DROP_STATES } from './drop-states';
export const DROP_EVENT_KINDS = ['raised', 'moved', 'owner', 'note', 'evidence', 'withdrawn'] as const;

/** One series that lost. */
export interface DropWitness {
  line: string;
  detector: string;
  judgement: BandJudgement;
}

/** What a drop was judged on, frozen. */
export interface DropEvidence {
  methodVersion: number;
  limitSetKey: string;
  limitSetVersion: number;
  thresholdDb: number;
  targetMarginDb: number;
  referenceKind: 'chosen' | 'pooled';
  referenceBuilds: { id: number; hardware: string; firmware: string }[];
  previousBuild: { id: number; hardware: string; firmware: string } | null;
  buildSweepIds: number[];
  referenceSweepIds: number[];
  witnesses: DropWitness[];
  /** Set-up of both sides, row by row. */
  setUp: { what: string; build: string; reference: string; isDifferent: boolean }[];
  /** Declared differences between the builds: switching frequencies, revisions, parameters. */
  changes: { what: string; before: string; now: string }[];
  harmonic: { stage: string; order: number; expectedHz: number } | null;
}

/** Query of the lists: `state` is `open`, or states with commas between; `owner` is `me`, `nobody` or a person's id. */
export const DropQuery = z.object({
  state: z
    .string()
    .transform((text) => (text === 'open' ? [...OPEN_DROP_STATES] : text.split(',')))
    .pipe(z.array(z.enum(DROP_STATES)))
    .optional(),
  owner: z.union([z.enum(['me', 'nobody']), z.coerce.number().int().positive()]).optional(),
});
export type DropQuery = z.infer<typeof DropQuery>;

/** A build that shows the loss, with what is left of the margin there. */
export const DropSighting = z
  .object({
    buildId: z.int(),
    hardware: z.string(),
    firmware: z.string(),
    differenceDb: z.number(),
    marginDb: z.number(),
    frequencyHz: z.number(),
    isOverLimit: z.boolean(),
  })
  .meta({ id: 'DropSighting' });
export type DropSighting = z.infer<typeof DropSighting>;

/** Row of GET /api/v1/products/:key/drops?state and GET /api/teams/:team/drops?state&owner */
export const DropSummary = z
  .object({
    id: z.int(),
    product: z.string(),
    productName: z.string(),
    team: z.string(),
    buildId: z.int(),
    hardware: z.string(),
    firmware: z.string(),
    operatingState: z.string(),
    band: z.string(),
    state: z.enum(DROP_STATES),
    owner: z.object({ id: z.int(), name: z.string() }).nullable(),
    differenceDb: z.number(),
    marginDb: z.number(),
    frequencyHz: z.number(),
    isOverLimit: z.boolean(),
    witnesses: z.array(z.object({ line: z.string(), detector: z.string() })),
    sentence: z.string(),
    /** Newest build that shows the loss: what is left now. The margin of the build that raised the drop stands beside it. */
    latest: DropSighting,
    /** Every build that shows the loss, the drop's own among them, oldest first. */
    seenIn: z.array(DropSighting),
    /** First build after `latest` whose margin is back. */
    noLongerSeenIn: z.object({ id: z.int(), hardware: z.string(), firmware: z.string() }).nullable(),
    createdAt: z.string(),
    updatedAt: z.string(),
  })
  .meta({ id: 'DropSummary' });
export type DropSummary = z.infer<typeof DropSummary>;

/** GET /api/v1/drops/:id */
export const DropView = DropSummary.extend({
  evidence: z.custom<DropEvidence>().meta({ type: 'object', description: 'what it was judged on, frozen' }),
  buildSwitching: z.array(SwitchingStage),
  remarks: z.array(Remark),
  fixedBy: z.object({ id: z.int(), hardware: z.string(), firmware: z.string() }).nullable(),
  history: z.array(z.object({ at: z.string(), actor: z.string(), kind: z.enum(DROP_EVENT_KINDS), text: z.string() })),
  /** States this caller may move the drop to. */
  moves: z.array(z.enum(DROP_STATES)),
  assignable: z.array(z.object({ id: z.int(), name: z.string() })),
});
export type DropView = z.infer<typeof DropView>;

/** POST /api/v1/drops/:id/moves; `fixed` must name the build that shows it, `accepted` a reason in `note`. */
export const DropMove = z.object({
  state: z.enum(['checking', 'causeKnown', 'fixed', 'accepted']),
  note: z.string().trim().max(4000).default(''),
  fixedByBuildId: z.int().optional(),
});
export type DropMove = z.infer<typeof DropMove>;
/** PUT /api/v1/drops/:id/owner */
export const DropOwner = z.object({ personId: z.int().nullable() });
/** POST /api/v1/drops/:id/notes */
export const DropNote = z.object({ text: z.string().trim().min(1, 'must not be empty').max(4000) });
