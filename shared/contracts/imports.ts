import * as z from 'zod';
import { JobRunView } from './job-runs';
import { patchOf } from './patch-of';
import { Problem } from './problem';
import { Remark, SweepTags } from './sweeps';

/** Field `options` (JSON) of POST /api/teams/:team/readings: what the file leaves out. */
export const ReadingOptions = SweepTags.pick({ frequencyUnit: true, levelUnit: true });

/**
 * POST /api/teams/:team/readings (multipart `file`, optional `options`): what a file holds; nothing is stored. The same
 * call with `Accept: application/octet-stream` answers every trace in full, as a frame of shared/traces/frames.ts with
 * `PreviewTrace` as the meta of each: the page asks for it when it draws the spectrum over the limit before saving.
 */
export const ReadingView = z.object({
  fileName: z.string(),
  sha256: z.string(),
  pointCount: z.int(),
  startHz: z.number(),
  stopHz: z.number(),
  medianStepHz: z.number(),
  frequencyUnit: z.string(),
  delimiter: z.string(),
  decimalMark: z.string(),
  rbwHz: z.number().nullable(),
  attenuationDb: z.number().nullable(),
  preamble: z
    .array(z.object({ line: z.int(), key: z.string(), value: z.string() }))
    .describe('the lines above the table; the key is empty where a line is plain text'),
  takenAt: z.iso
    .datetime()
    .nullable()
    .describe("when the file says it was recorded, UTC; a time without a zone is read in the team's"),
  traces: z.array(
    z.object({
      trace: z.int(),
      name: z.string(),
      levelUnit: z.string(),
      detector: z.string().nullable(),
      line: z.string().nullable(),
      highestDbuv: z.number(),
    }),
  ),
  inferred: z.array(z.object({ what: z.string(), value: z.string(), why: z.string() })),
  remarks: z.array(Remark),
});
export type ReadingView = z.infer<typeof ReadingView>;

/** `meta` of every trace of a preview frame. */
export type PreviewTrace = ReadingView['traces'][number];

/** Tags common to a batch and those of one trace laid over them; together they must make complete `SweepTags`. */
export const BatchTags = patchOf(SweepTags).strict();
export type BatchTags = z.infer<typeof BatchTags>;
export const BatchItemTags = patchOf(SweepTags).strict();
export type BatchItemTags = z.infer<typeof BatchItemTags>;

/**
 * POST /api/teams/:team/imports, multipart: `files` (many) and `plan` (JSON). Every item names a file by its place in
 * `files`. Answers 202 with the batch; the jobs process imports it item by item.
 */
export const ImportPlan = z.object({
  tags: BatchTags,
  items: z
    .array(z.object({ file: z.int().min(0), tags: BatchItemTags }))
    .min(1, 'choose at least one trace')
    .max(2000),
});
export type ImportPlan = z.infer<typeof ImportPlan>;

/** GET /api/teams/:team/imports/:id; GET /api/teams/:team/imports lists the last 20 without items */
export const ImportBatchView = z.object({
  id: z.int(),
  createdAt: z.string(),
  createdBy: z.string(),
  finishedAt: z.string().nullable(),
  total: z.int(),
  imported: z.int(),
  duplicate: z.int(),
  refused: z.int(),
  waiting: z.int(),
  run: JobRunView.nullable(),
  items: z.array(
    z.object({
      id: z.int(),
      fileName: z.string(),
      tags: BatchItemTags,
      status: z.enum(['waiting', 'imported', 'duplicate', 'refused']),
      sweepId: z.int().nullable(),
      productKey: z.string().nullable(),
      productName: z.string().nullable(),
      buildId: z.int().nullable(),
      worstMarginDb: z.number().nullable(),
      problem: Problem.nullable(),
    }),
  ),
});
export type ImportBatchView = z.infer<typeof ImportBatchView>;
/** GET /api/teams/:team/last-tags: the tags of the caller's last sweep in the team, for "same as last time". */
export const LastTags = BatchTags.nullable();
