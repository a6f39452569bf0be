import type { Context } from '../context';
import { type Bench, type BenchUse, benchUse, listBenchesOf } from './bench-store';

export interface UsedBench {
  bench: Bench;
  use: BenchUse;
}

/** Benches of a team with how much they are used, by name; archived ones too. */
export function listBenches(context: Context, teamId: number): UsedBench[] {
  return listBenchesOf(context.db, teamId).map((bench) => withUse(context, bench));
}

export function withUse(context: Context, bench: Bench): UsedBench {
  return { bench, use: benchUse(context.db, bench.id) };
}
