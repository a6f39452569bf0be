import * as z from 'zod';

export const SwitchingStage = z
  .object({
    stage: z.string().trim().min(1).max(40).describe('such as PFC or LLC'),
    frequencyHz: z.number().min(100).max(30e6),
    spreadPercent: z.number().min(0).max(50).default(0).describe('total excursion, percent of the frequency'),
  })
  .meta({ id: 'SwitchingStage' });
export type SwitchingStage = z.infer<typeof SwitchingStage>;
