import * as z from 'zod';
import { patchOf } from './patch-of';
import { Key, Name, Notes } from './primitives';

/** GET /api/teams/:team/benches */
export const BenchView = z
  .object({
    key: z.string(),
    name: z.string(),
    location: z.string(),
    lisn: z.string(),
    receiver: z.string(),
    notes: z.string(),
    isArchived: z.boolean(),
    sweepCount: z.int(),
    lastSweepAt: z.string().nullable(),
    /** Spread of runs on this bench with where it comes from, dB. */
    spread: z.object({ sdDb: z.number(), degreesOfFreedom: z.number(), source: z.string() }),
  })
  .meta({ id: 'Bench' });
export type BenchView = z.infer<typeof BenchView>;
/** POST /api/teams/:team/benches, PATCH /api/teams/:team/benches/:bench */
export const BenchInput = z.object({
  key: Key,
  name: Name,
  location: z.string().max(200).default(''),
  lisn: z.string().max(400).default(''),
  receiver: z.string().max(400).default(''),
  notes: Notes.default(''),
});
export type BenchInput = z.infer<typeof BenchInput>;
export const BenchPatch = patchOf(BenchInput.omit({ key: true })).extend({ isArchived: z.boolean().optional() });
export type BenchPatch = z.infer<typeof BenchPatch>;
