import type { BenchView } from '@shared/contracts/benches';
import { isoTimeOrNull } from '../iso-time';
import type { UsedBench } from './list-benches';

export function presentBench({ bench, use, spread }: UsedBench): BenchView {
  const { key, name, location, lisn, receiver, notes } = bench;
  return {
    key,
    name,
    location,
    lisn,
    receiver,
    notes,
    isArchived: bench.archivedAt !== null,
    sweepCount: use.sweepCount,
    lastSweepAt: isoTimeOrNull(use.lastSweepAt),
    spread,
  };
}
