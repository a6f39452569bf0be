import type { BenchView } from '@shared/contracts/benches';
import { PLANNING_SPREAD } from '@shared/judging/estimate-spreads';
import { isoTimeOrNull } from '../iso-time';
import type { UsedBench } from './list-benches';

export function presentBench({ bench, use }: UsedBench): BenchView {
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
    spread: {
      sdDb: PLANNING_SPREAD.sd,
      degreesOfFreedom: PLANNING_SPREAD.degreesOfFreedom,
      source: "planning value, not yet this bench's own",
    },
  };
}
