import * as z from 'zod';
import { DetectorName, Line, Name, SweepKind, Time } from './primitives';
import { SwitchingStage } from './switching';

/** `tags` of POST /api/v1/sweeps */
export const SweepTags = z
  .object({
    product: z.string().min(1),
    hardware: Name,
    firmware: Name,
    unit: z.string().trim().min(1).max(120).optional(),
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
    run: z.string().trim().min(1).max(120).optional().describe('default: the day and bench'),
    trace: z.int().min(1).max(64).default(1).describe('which level column, 1 first'),
    frequencyUnit: z.enum(['Hz', 'kHz', 'MHz', 'GHz']).optional(),
    levelUnit: z.enum(['dBuV', 'dBm', 'dBmV']).optional(),
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

/** GET /api/v1/sweeps/:id and a row of GET /api/v1/sweeps?team&product&build&state&bench&line&detector&kind&before&limit */
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

/** JSON header of a binary overlay, GET /api/v1/overlay?product&team&sweeps=1,2&builds=3,4&state&line&detector */
export interface OverlayHeader {
  traces: {
    sweepId: number;
    label: string;
    buildId: number;
    hardware: string;
    firmware: string;
    state: string;
    line: string;
    detector: string;
    kind: string;
    takenAt: string;
    /** Which frequency grid of the frame, 0 first. */
    grid: number;
    worst: MarginPointView | null;
  }[];
  limits: {
    detector: string;
    title: string;
    segments: { fromHz: number; toHz: number; fromDbuv: number; toDbuv: number }[];
  }[];
}
