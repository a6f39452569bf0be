import * as z from 'zod';

export const JOB_NAMES = ['judge', 'import', 'remeasure', 'digest', 'mail', 'prune'] as const;
export type JobName = (typeof JOB_NAMES)[number];
export const JOB_STATUSES = ['waiting', 'running', 'done', 'failed'] as const;
export const JOB_TRIGGERS = ['schedule', 'start', 'person', 'token', 'import'] as const;

/** GET /api/teams/:team/jobs (newest first), GET /api/v1/runs/:id */
export const JobRunView = z
  .object({
    id: z.int(),
    job: z.enum(JOB_NAMES),
    trigger: z.enum(JOB_TRIGGERS),
    requestedBy: z.string(),
    status: z.enum(JOB_STATUSES),
    queuedAt: z.string(),
    startedAt: z.string().nullable(),
    finishedAt: z.string().nullable(),
    attempts: z.int(),
    total: z.int(),
    done: z.int(),
    counts: z.record(z.string(), z.number()),
    errors: z.array(z.object({ subject: z.string(), message: z.string() })),
  })
  .meta({ id: 'JobRun' });
export type JobRunView = z.infer<typeof JobRunView>;

/** POST /api/teams/:team/judge (lead): judges what is not judged yet of one product, or of all the team's. 202 */
export const JudgeRequest = z.object({ product: z.string().optional() });
export const JudgeStarted = z.object({ runs: z.array(JobRunView) });
export type JudgeStarted = z.infer<typeof JudgeStarted>;
