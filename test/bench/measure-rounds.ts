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

export function mean(numbers: readonly number[]): number {
  return numbers.reduce((sum, one) => sum + one, 0) / numbers.length;
}

export interface Ratio {
  whole: number;
  least: number;
  greatest: number;
}

/** CPU time of all rounds over that of the floors together, and the least and greatest ratio of a round. */
export function ratioOf(of: Measured, floors: readonly Measured[]): Ratio {
  const floorMs = of.cpuMs.map((_, round) => floors.reduce((sum, floor) => sum + (floor.cpuMs[round] ?? NaN), 0));
  const ratios = of.cpuMs.map((cpuMs, round) => cpuMs / (floorMs[round] ?? NaN));
  // Not the median of the rounds: the database moves its log into its file in some of them only.
  return { whole: mean(of.cpuMs) / mean(floorMs), least: Math.min(...ratios), greatest: Math.max(...ratios) };
}
