import { DETECTORS } from '@shared/detectors/detectors';
import type { DemoBuild, DemoSession } from './scenario-types';

export const DAY_MS = 86_400_000;
const HOUR_MS = 3_600_000;
const MINUTE_MS = 60_000;

/** One line of a product's history, as short as it can be said. */
export interface BuildRow {
  hardware: string;
  firmware: string;
  /** Days before the demo's today. */
  daysAgo: number;
  changes: string[];
  /** Set-ups made anew, one a day; 0 for a build nobody measured. Default 1. */
  runs?: number;
  /** States measured; default all. */
  states?: string[];
  unit?: string;
  bench?: string;
  padMistake?: DemoSession['padMistake'];
  lot?: Partial<DemoBuild['lot']>;
  /** Whether the bench was also swept with the device off. */
  background?: boolean;
}

/** What the builds of a product have in common. */
export interface MeasuringHabit {
  states: string[];
  unit: string;
  bench: string;
  /** Hour of the day the bench work starts, UTC. */
  hourUtc: number;
}

/**
 * Writes a product's history out: every build with the runs that were taken of it, on the days after it was built.
 *
 * @param rows the history, oldest first
 * @param habit what is usual for the product
 * @param nowMs the demo's now, UTC ms; only its day is used
 * @returns builds, oldest first
 */
export function writeBuilds(rows: BuildRow[], habit: MeasuringHabit, nowMs: number): DemoBuild[] {
  const todayMs = Math.floor(nowMs / DAY_MS) * DAY_MS;
  return rows.map((row) => {
    const builtAtMs = todayMs - row.daysAgo * DAY_MS + 5 * HOUR_MS;
    return {
      hardware: row.hardware,
      firmware: row.firmware,
      builtAtMs,
      changes: row.changes,
      lot: { differentialInductance: 1, capacitance: 1, ...row.lot },
      sessions: sessionsOf(row, habit, todayMs - row.daysAgo * DAY_MS),
    };
  });
}

function sessionsOf(row: BuildRow, habit: MeasuringHabit, buildDayMs: number): DemoSession[] {
  const sessions: DemoSession[] = [];
  for (let setUp = 0; setUp < (row.runs ?? 1); setUp++) {
    const startMs = buildDayMs + (setUp + 1) * DAY_MS + habit.hourUtc * HOUR_MS;
    const common = {
      bench: row.bench ?? habit.bench,
      unit: row.unit ?? habit.unit,
      run: `${new Date(startMs).toISOString().slice(0, 10)}-a`,
      setUp,
      padMistake: row.padMistake ?? null,
      lines: ['L', 'N'] as ('L' | 'N')[],
      detectors: [...DETECTORS],
    };
    const states = row.states ?? habit.states;
    if (row.background && setUp === 0) {
      sessions.push({ ...common, kind: 'background', state: states[0], takenAtMs: startMs });
    }
    states.forEach((state, index) => {
      const takenAtMs = startMs + (25 + 35 * index) * MINUTE_MS;
      sessions.push({ ...common, kind: 'product', state, takenAtMs });
    });
  }
  return sessions;
}
