import type { BenchView } from '@shared/contracts/benches';
import type { Context } from '../context';
import { benchSpread } from './bench-spread';
import { type Bench, type BenchUse, benchUse, listBenchesOf } from './bench-store';

export interface UsedBench {
  bench: Bench;
  use: BenchUse;
  spread: BenchView['spread'];
}

/** Benches of a team with how much they are used, by name; archived ones too. */
export function listBenches(context: Context, teamId: number): UsedBench[] {
  return listBenchesOf(context.db, teamId).map((bench) => withUse(context, bench));
}

export function withUse(context: Context, bench: Bench): UsedBench {
  return { bench, use: benchUse(context.db, bench.id), spread: benchSpread(context, bench.id) };
}
