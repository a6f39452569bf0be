import * as z from 'zod';
import { patchOf } from './patch-of';
import { Name, Notes, Time, VerdictName } from './primitives';
import { SwitchingStage } from './switching';

/** GET /api/v1/products/:key/builds, oldest first */
export const BuildSummary = z
  .object({
    id: z.int(),
    position: z.int(),
    hardware: z.string(),
    firmware: z.string(),
    commit: z.string(),
    builtAt: z.string(),
    sweepCount: z.int(),
    worstMarginDb: z.number().nullable(),
    worstFrequencyHz: z.number().nullable(),
    verdict: VerdictName.nullable(),
    isOverLimit: z.boolean(),
    isStale: z.boolean().describe('sweeps came in, or the reference changed, after it was judged'),
    isReference: z.boolean(),
    openDrops: z.int(),
    unmeasuredStates: z.array(z.string()),
  })
  .meta({ id: 'BuildSummary' });
export type BuildSummary = z.infer<typeof BuildSummary>;

/** GET /api/v1/products/:key/builds/:id */
export const BuildView = BuildSummary.extend({
  hardwareNotes: z.string(),
  firmwareNotes: z.string(),
  notes: z.string(),
  switching: z.array(SwitchingStage),
  parameters: z.array(z.object({ name: z.string(), value: z.string() })),
  judgedAt: z.string().nullable(),
  previous: z.object({ id: z.int(), hardware: z.string(), firmware: z.string() }).nullable(),
  next: z.object({ id: z.int(), hardware: z.string(), firmware: z.string() }).nullable(),
}).meta({ id: 'Build' });
export type BuildView = z.infer<typeof BuildView>;

/** POST /api/v1/products/:key/builds; revisions that do not exist yet are created. */
export const BuildInput = z.object({
  hardware: Name,
  firmware: Name,
  commit: z.string().max(80).default(''),
  firmwareNotes: Notes.default(''),
  hardwareNotes: Notes.default(''),
  builtAt: Time,
  notes: Notes.default(''),
  switching: z.array(SwitchingStage).max(8).default([]),
  parameters: z
    .array(z.object({ name: Name, value: z.string().max(400) }))
    .max(40)
    .default([]),
});
export type BuildInput = z.infer<typeof BuildInput>;
/** PATCH /api/v1/products/:key/builds/:id */
export const BuildPatch = patchOf(BuildInput.omit({ hardware: true, firmware: true }));
