import { JOB_NAMES, JOB_STATUSES, JOB_TRIGGERS } from '@shared/contracts/job-runs';
import { sql } from 'drizzle-orm';
import { index, integer, sqliteTable, text, uniqueIndex } from 'drizzle-orm/sqlite-core';
import { moment, rowId } from './columns';

export interface JobError {
  subject: string;
  message: string;
}

/** The queue and the record of every run in one table. A null team: a job over the whole installation. */
export const jobRuns = sqliteTable(
  'job_runs',
  {
    id: rowId(),
    job: text('job', { enum: JOB_NAMES }).notNull(),
    teamId: integer('team_id'),
    payload: text('payload', { mode: 'json' }).$type<Record<string, unknown>>().notNull().default({}),
    /** At most one run with this key waits and at most one runs at a time. */
    lockKey: text('lock_key').notNull(),
    /** Set for runs that must happen only once ever, such as one scheduled minute. */
    onceKey: text('once_key'),
    trigger: text('trigger', { enum: JOB_TRIGGERS }).notNull(),
    requestedBy: text('requested_by').notNull(),
    status: text('status', { enum: JOB_STATUSES }).notNull().default('waiting'),
    queuedAt: moment('queued_at').notNull(),
    startedAt: moment('started_at'),
    finishedAt: moment('finished_at'),
    /** Worker that holds the run, and until when; after that another may take it. */
    claimedBy: text('claimed_by'),
    leaseUntil: moment('lease_until'),
    attempts: integer('attempts').notNull().default(0),
    total: integer('total').notNull().default(0),
    done: integer('done').notNull().default(0),
    counts: text('counts', { mode: 'json' }).$type<Record<string, number>>().notNull().default({}),
    errors: text('errors', { mode: 'json' }).$type<JobError[]>().notNull().default([]),
  },
  (table) => [
    uniqueIndex('job_runs_waiting')
      .on(table.lockKey)
      .where(sql`status = 'waiting'`),
    uniqueIndex('job_runs_running')
      .on(table.lockKey)
      .where(sql`status = 'running'`),
    uniqueIndex('job_runs_once').on(table.onceKey),
    index('job_runs_status').on(table.status, table.queuedAt),
    index('job_runs_team').on(table.teamId, table.queuedAt),
  ],
);
