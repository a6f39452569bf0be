import * as z from 'zod';

/** Payload of a digest run. */
export const DigestOrder = z.object({
  teamId: z.int(),
  /** End of the week the digest tells of, UTC milliseconds. */
  dueAt: z.int(),
  /** Set for "send me one now". */
  onlyRecipientId: z.int().optional(),
});
export type DigestOrder = z.infer<typeof DigestOrder>;
