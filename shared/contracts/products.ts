import * as z from 'zod';
import { patchOf } from './patch-of';
import { Key, Name, Notes, VerdictName } from './primitives';

export const StateView = z
  .object({
    id: z.int(),
    name: z.string(),
    supplyVoltageV: z.number().nullable(),
    supplyFrequencyHz: z.number().nullable(),
    load: z.string(),
    mode: z.string(),
    isRequired: z.boolean(),
  })
  .meta({ id: 'OperatingState' });
export type StateView = z.infer<typeof StateView>;
export const StateInput = z.object({
  name: Name,
  supplyVoltageV: z.number().min(0).max(2000).nullable().default(null),
  supplyFrequencyHz: z.number().min(0).max(1000).nullable().default(null),
  load: z.string().max(120).default(''),
  mode: z.string().max(120).default(''),
  isRequired: z.boolean().default(true),
});
export const StatePatch = patchOf(StateInput);

/** GET /api/v1/products: those of the caller's teams and those shared with them; `?team=` narrows. */
export const ProductSummary = z
  .object({
    key: z.string(),
    name: z.string(),
    team: z.string(),
    teamName: z.string(),
    isShared: z.boolean().describe('owned by another team, read-only here'),
    limitSetKey: z.string(),
    targetMarginDb: z.number(),
    buildCount: z.int(),
    latestBuild: z
      .object({
        id: z.int(),
        hardware: z.string(),
        firmware: z.string(),
        builtAt: z.string(),
        worstMarginDb: z.number().nullable(),
        worstFrequencyHz: z.number().nullable(),
        verdict: VerdictName.nullable(),
        changeDb: z
          .number()
          .nullable()
          .describe('judged change of margin against the reference where it is tightest, dB'),
      })
      .nullable(),
    previousWorstMarginDb: z.number().nullable(),
    openDrops: z.int(),
    unmeasuredStates: z.array(z.string()).describe('required states without a sweep of the latest build'),
    trend: z.array(z.number().nullable()).describe('worst margin of the last 30 builds, oldest first, dB'),
  })
  .meta({ id: 'ProductSummary' });
export type ProductSummary = z.infer<typeof ProductSummary>;

/** GET /api/v1/products/:key */
export const ProductView = ProductSummary.omit({ trend: true, previousWorstMarginDb: true })
  .extend({
    description: z.string(),
    /** Null: the team's target margin is used. */
    ownTargetMarginDb: z.number().nullable(),
    states: z.array(StateView),
    units: z.array(z.string()),
    lines: z.array(z.string()).describe('lines with sweeps'),
    detectors: z.array(z.string()).describe('detectors with sweeps'),
    reference: z
      .object({
        buildId: z.int(),
        hardware: z.string(),
        firmware: z.string(),
        chosenBy: z.string(),
        chosenAt: z.string(),
        reason: z.string(),
      })
      .nullable(),
    sharedWith: z.array(z.object({ team: z.string(), teamName: z.string() })),
  })
  .meta({ id: 'Product' });
export type ProductView = z.infer<typeof ProductView>;

/** POST /api/v1/products?team=, PATCH /api/v1/products/:key */
export const ProductInput = z.object({
  key: Key,
  name: Name,
  description: Notes.default(''),
  limitSetKey: z.string(),
  targetMarginDb: z.number().min(0).max(40).nullable().default(null),
});
export const ProductPatch = patchOf(ProductInput.omit({ key: true }));
/** PUT /api/v1/products/:key/reference {buildId|null, reason} */
export const ReferenceChoice = z.object({
  buildId: z.int().nullable(),
  reason: z.string().trim().min(3, 'give a reason').max(400),
});
/** PUT /api/v1/products/:key/shares {teams} : whole list of team keys that may read */
export const ProductShares = z.object({ teams: z.array(z.string()).max(100) });
