import type { SweepTagsInput } from '@shared/contracts/sweeps';
import type { Bench } from '../../server/benches/find-bench';
import type { Context } from '../../server/context';
import type { products, teams } from '../../server/db/schema';
import { judgeJob } from '../../jobs/judge';
import { workOnce } from '../../jobs/worker';
import { buildSweep, type TraceShape } from './sweep-builder';
import { buildBench, buildProduct, buildTeam } from './team-builder';

type Team = typeof teams.$inferSelect;
type Product = typeof products.$inferSelect;

/** A team with one product under the class B limit of CISPR 32 and one bench. */
export interface Laboratory {
  team: Team;
  product: Product;
  bench: Bench;
}

export function buildLaboratory(context: Context): Laboratory {
  const team = buildTeam(context);
  return { team, product: buildProduct(context, team.id), bench: buildBench(context, team.id) };
}

/** A line on a point of the receiver's grid, where the class B QP limit is 65.5 dBuV. */
export const LINE_HZ = 159_000;
const DAY_MS = 24 * 3600_000;
const FIRST_DAY = Date.UTC(2026, 0, 5, 9);

/** The day build `n` is measured on; builds follow each other day by day. */
export function dayOf(n: number): number {
  return FIRST_DAY + n * DAY_MS;
}

export interface Measurement {
  /** Level of the line at 159 kHz in dBuV, one a run. */
  levelsDbuv: readonly number[];
  tags?: Partial<SweepTagsInput>;
  shape?: TraceShape;
  /** Moves the session within the day, or to another. */
  takenAt?: number;
}

/** Measures build `n` (firmware 1.n), each level in a run of its own an hour apart. Returns the sweeps' ids. */
export function measureBuild(
  context: Context,
  { product, bench }: Pick<Laboratory, 'product' | 'bench'>,
  n: number,
  { levelsDbuv, tags, shape, takenAt = dayOf(n) }: Measurement,
): number[] {
  return levelsDbuv.map((levelDbuv, index) => {
    const at = takenAt + index * 3600_000;
    return buildSweep(
      context,
      product,
      bench,
      { firmware: `1.${n}`, takenAt: new Date(at).toISOString(), run: `run ${at}`, ...tags },
      { peaks: [[LINE_HZ, levelDbuv]], ...shape },
    );
  });
}

/** Five quiet builds of one run each, the line within 0.4 dB of 50 dBuV: 15.5 dB of margin. */
export function measureQuietBuilds(context: Context, laboratory: Pick<Laboratory, 'product' | 'bench'>): void {
  [50, 50.3, 49.8, 50.1, 49.7].forEach((levelDbuv, index) =>
    measureBuild(context, laboratory, index + 1, { levelsDbuv: [levelDbuv] }),
  );
}

/** Asks the way the clock does, then works until nothing waits. */
export async function runJudging(context: Context): Promise<void> {
  judgeJob.request(context, 'schedule');
  while (await workOnce(context, 'worker', [judgeJob]));
}
