import * as z from 'zod';

/** GET /api/v1/limits */
export const LimitSetView = z
  .object({
    key: z.string(),
    version: z.int(),
    title: z.string(),
    source: z.string(),
    edition: z.string(),
    note: z.string(),
    lines: z.array(
      z.object({
        detector: z.string(),
        segments: z.array(z.object({ fromHz: z.number(), toHz: z.number(), fromDbuv: z.number(), toDbuv: z.number() })),
      }),
    ),
  })
  .meta({ id: 'LimitSet' });
export type LimitSetView = z.infer<typeof LimitSetView>;
