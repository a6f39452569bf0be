/** One way to do a piece of work, `units` times a call. */
export interface Candidate {
  name: string;
  units: number;
  run(): void;
}

export interface Measured {
  name: string;
  /** CPU milliseconds a unit, one a round. */
  cpuMs: number[];
}

/**
 * Measures candidates side by side: in every round each runs once, the start rotated, so that every round gives ratios
 * under equal conditions on a machine that others use too. Process CPU time counts, so that garbage collection does and
 * waiting for a core does not.
 */
export function measureRounds(candidates: readonly Candidate[], rounds: number): Measured[] {
  for (const candidate of candidates) candidate.run();
  const measured = candidates.map(({ name }): Measured => ({ name, cpuMs: [] }));
  for (let round = 0; round < rounds; round++) {
    for (let turn = 0; turn < candidates.length; turn++) {
      const index = (round + turn) % candidates.length;
      const candidate = candidates[index];
      if (candidate === undefined) continue;
      const before = process.cpuUsage();
      candidate.run();
      const { user, system } = process.cpuUsage(before);
      measured[index]?.cpuMs.push((user + system) / 1000 / candidate.units);
    }
  }
  return measured;
}

export function median(numbers: readonly number[]): number {
  const sorted = [...numbers].sort((a, b) => a - b);
  return sorted[sorted.length >> 1] ?? NaN;
}

/** Median, least and greatest of the ratios of the rounds. */
export function ratioOf(of: Measured, to: readonly Measured[]): { median: number; least: number; greatest: number } {
  const ratios = of.cpuMs.map(
    (cpuMs, round) => cpuMs / to.reduce((sum, floor) => sum + (floor.cpuMs[round] ?? NaN), 0),
  );
  return { median: median(ratios), least: Math.min(...ratios), greatest: Math.max(...ratios) };
}
