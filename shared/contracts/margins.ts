import * as z from 'zod';
import { DetectorName, Line, VerdictName } from './primitives';

/** Filter of trend and margin map; leave out to take the worst over all. */
export const SeriesFilter = z.object({
  state: z.string().optional(),
  line: Line.optional(),
  detector: DetectorName.optional(),
  limit: z.string().optional().describe("key of the product's limit set; another one is refused"),
});
export type SeriesFilter = z.infer<typeof SeriesFilter>;
/** Query of the trend: a band on top. */
export const TrendQuery = SeriesFilter.extend({ band: z.string().optional() });

/** GET /api/v1/products/:key/trend?state&line&detector&band */
export const TrendView = z
  .object({
    product: z.string(),
    limitSetKey: z.string(),
    targetMarginDb: z.number(),
    band: z.string().nullable(),
    bands: z.array(z.string()).describe('bands one can ask for'),
    referenceBuildId: z.int().nullable(),
    points: z.array(
      z.object({
        buildId: z.int(),
        hardware: z.string(),
        firmware: z.string(),
        builtAt: z.string(),
        worstMarginDb: z.number().nullable().describe('null: not measured'),
        worstFrequencyHz: z.number().nullable(),
        runs: z.int(),
        lowestDb: z.number().nullable().describe('lowest and highest worst margin over the runs'),
        highestDb: z.number().nullable(),
        verdict: VerdictName.nullable(),
        openDrops: z.int(),
        switching: z.array(z.object({ stage: z.string(), frequencyHz: z.number() })),
      }),
    ),
  })
  .meta({ id: 'Trend' });
export type TrendView = z.infer<typeof TrendView>;

/** GET /api/v1/products/:key/margin-map?state&line&detector; `cells` are row by row, dB, null where not measured. */
export const MarginMapView = z
  .object({
    product: z.string(),
    targetMarginDb: z.number(),
    edgesHz: z.array(z.number()).describe('cells + 1 cell edges'),
    builds: z.array(
      z.object({
        buildId: z.int(),
        hardware: z.string(),
        firmware: z.string(),
        builtAt: z.string(),
        verdict: VerdictName.nullable(),
        isReference: z.boolean(),
      }),
    ),
    cells: z.array(z.array(z.number().nullable())),
  })
  .meta({ id: 'MarginMap' });
export type MarginMapView = z.infer<typeof MarginMapView>;
