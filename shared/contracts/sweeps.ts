import { FREQUENCY_UNITS } from '@shared/units/frequency-unit';
import { LEVEL_UNITS } from '@shared/units/level-unit';
import * as z from 'zod';
import { OVERLAY_MOST_TRACES } from './overlay-most-traces';
import { DetectorName, Line, Name, SweepKind, Time } from './primitives';
import { SwitchingStage } from './switching';

/**
 * `tags` of POST /api/v1/sweeps. The query `team` names the owning team where several teams of the caller have a product
 * with the key.
 */
export const SweepTags = z
  .strictObject({
    product: z.string().min(1),
    hardware: Name,
    firmware: Name,
    unit: Name.optional(),
    state: Name,
    bench: z.string().min(1),
    line: Line,
    detector: DetectorName,
    kind: SweepKind.default('product'),
    takenAt: Time.optional().describe('default: the time of the upload'),
    rbwHz: z.number().positive().max(1e6).optional(),
    attenuationDb: z
      .number()
      .min(-100)
      .max(100)
      .optional()
      .describe('set at the receiver, already part of its reading'),
    run: Name.optional().describe('default: the day and bench'),
    trace: z.int().min(1).max(64).default(1).describe('which level column, 1 first'),
    frequencyUnit: z.enum(FREQUENCY_UNITS).optional(),
    levelUnit: z.enum(LEVEL_UNITS).optional(),
    corrected: z.boolean().default(false).describe('whether the file already holds corrected levels'),
    switching: z.array(SwitchingStage).max(8).optional(),
  })
  .meta({ id: 'SweepTags' });
export type SweepTags = z.infer<typeof SweepTags>;
export type SweepTagsInput = z.input<typeof SweepTags>;

export const MarginPointView = z
  .object({ marginDb: z.number(), frequencyHz: z.number(), levelDbuv: z.number(), limitDbuv: z.number() })
  .meta({ id: 'MarginPoint' });
export type MarginPointView = z.infer<typeof MarginPointView>;

export const BandMarginView = z
  .object({ band: z.string(), worst: MarginPointView.nullable(), coveredFraction: z.number() })
  .meta({ id: 'BandMargin' });

export const Remark = z.object({ code: z.string(), text: z.string() }).meta({ id: 'Remark' });
export type Remark = z.infer<typeof Remark>;

/** GET /api/v1/sweeps/:id and a row of GET /api/v1/sweeps */
export const SweepView = z
  .object({
    id: z.int(),
    product: z.string(),
    productName: z.string(),
    team: z.string(),
    buildId: z.int(),
    hardware: z.string(),
    firmware: z.string(),
    unit: z.string().nullable(),
    state: z.string(),
    bench: z.string(),
    line: Line,
    detector: DetectorName,
    kind: SweepKind,
    takenAt: z.string(),
    run: z.string(),
    rbwHz: z.number().nullable(),
    attenuationDb: z.number().nullable(),
    correction: z.enum(['inFile', 'none']),
    pointCount: z.int(),
    startHz: z.number(),
    stopHz: z.number(),
    medianStepHz: z.number(),
    fileName: z.string(),
    trace: z.int(),
    limitSetKey: z.string(),
    worst: MarginPointView.nullable(),
    bands: z.array(BandMarginView),
    remarks: z.array(Remark),
    importedAt: z.string(),
    importedBy: z.string(),
  })
  .meta({ id: 'Sweep' });
export type SweepView = z.infer<typeof SweepView>;

/** Query of GET /api/v1/sweeps, newest import first; without team and product: of all teams of the caller. */
export const SweepQuery = z.object({
  team: z.string().optional(),
  product: z.string().optional(),
  build: z.coerce.number().int().positive().optional(),
  state: z.string().optional(),
  bench: z.string().optional(),
  line: Line.optional(),
  detector: DetectorName.optional(),
  kind: SweepKind.optional(),
  before: z.coerce.number().int().positive().optional().describe('`nextBefore` of the page before'),
  limit: z.coerce.number().int().min(1).max(200).default(50),
});
export type SweepQuery = z.infer<typeof SweepQuery>;
export const SweepPage = z.object({ sweeps: z.array(SweepView), nextBefore: z.int().nullable() });
export type SweepPage = z.infer<typeof SweepPage>;

/** Answer to POST /api/v1/sweeps: 201, or 200 with `duplicate: true`. */
export const SweepStored = z.object({ duplicate: z.boolean(), sweep: SweepView }).meta({ id: 'SweepStored' });
export type SweepStored = z.infer<typeof SweepStored>;

/** GET /api/v1/sweeps/:id/trace as JSON; `Accept: application/octet-stream` gives the frames of shared/traces/frames.ts. */
export const TraceView = z
  .object({
    id: z.int(),
    frequenciesHz: z.array(z.number()),
    levelsDbuv: z.array(z.number()),
    limitsDbuv: z.array(z.number().nullable()),
  })
  .meta({ id: 'Trace' });

const Ids = z
  .string()
  .transform((text) => (text === '' ? [] : text.split(',').map(Number)))
  .pipe(z.array(z.int().positive()).max(OVERLAY_MOST_TRACES));

/**
 * Query of GET /api/v1/overlay: sweeps by number, and for every build and series (state, line, detector) that the filter
 * leaves the newest run's sweep with the least margin. `kind=background` adds the background sweeps of the same bench and
 * day. More than 40 traces are refused: narrow the filter.
 */
export const OverlayQuery = z.object({
  team: z.string().optional(),
  product: z.string(),
  sweeps: Ids.optional(),
  builds: Ids.optional(),
  state: z.string().optional(),
  line: Line.optional(),
  detector: DetectorName.optional(),
  kind: z.enum(['product', 'background']).default('product'),
});
export type OverlayQuery = z.infer<typeof OverlayQuery>;

/**
 * `meta` of every trace in the frame of shared/traces/frames.ts that GET /api/v1/overlay and
 * GET /api/v1/sweeps/:id/trace (`Accept: application/octet-stream`) answer.
 */
export interface OverlayTrace {
  sweepId: number;
  label: string;
  buildId: number;
  hardware: string;
  firmware: string;
  state: string;
  bench: string;
  line: string;
  detector: string;
  kind: string;
  run: string;
  takenAt: string;
  worst: MarginPointView | null;
  /** The limit line the trace is held against; a PK trace against the QP line. */
  limit: {
    detector: string;
    title: string;
    segments: { fromHz: number; toHz: number; fromDbuv: number; toDbuv: number }[];
  };
}
