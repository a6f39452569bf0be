import type { Context } from '../context';
import type { JobError } from '../db/schema/job-runs';
import { LEASE_MS } from './claim-run';
import { type JobRun, updateHeldRun } from './run-store';

/** Thrown when another worker has taken the run over; the work so far stands, each item being its own transaction. */
export class RunLostError extends Error {
  override readonly name = 'RunLostError';
}

/** A run this worker holds: progress goes through it, and every report renews the lease. */
export class HeldRun {
  private total = 0;
  private done = 0;
  private readonly counts: Record<string, number> = {};
  private readonly errors: JobError[] = [];

  constructor(
    private readonly context: Context,
    readonly run: JobRun,
    private readonly worker: string,
  ) {}

  /** Says how many items there are in all. */
  expect(total: number): void {
    this.total = total;
    this.report();
  }

  /** One more item ended; `outcome` is counted under its name. */
  advance(outcome: string): void {
    this.done += 1;
    this.total = Math.max(this.total, this.done);
    this.counts[outcome] = (this.counts[outcome] ?? 0) + 1;
    this.report();
  }

  /** An item failed; the run goes on. */
  note(subject: string, error: unknown): void {
    this.errors.push({ subject, message: error instanceof Error ? error.message : String(error) });
    this.advance('failed');
  }

  /** Renews the lease in the middle of a long item. */
  report(): void {
    this.update({ leaseUntil: this.context.now() + LEASE_MS });
  }

  finish(): void {
    this.update({ status: 'done', finishedAt: this.context.now(), leaseUntil: null });
  }

  fail(error: unknown): void {
    this.errors.push({ subject: this.run.job, message: error instanceof Error ? error.message : String(error) });
    this.update({ status: 'failed', finishedAt: this.context.now(), leaseUntil: null });
  }

  private update(change: Parameters<typeof updateHeldRun>[3]): void {
    const { total, done, counts, errors } = this;
    const isHeld = updateHeldRun(this.context.db, this.run.id, this.worker, { total, done, counts, errors, ...change });
    if (!isHeld) throw new RunLostError(`run ${this.run.id} was taken over by another worker`);
  }
}
