import type { LimitLine } from './limit-line';

/** A stretch of frequency that gets one worst margin and one verdict. Both ends belong to it. */
export interface Band {
  /** Written in MHz, for example "0.15-0.5 MHz"; before it the name of a team's own band. */
  readonly key: string;
  readonly fromHz: number;
  readonly toHz: number;
}

/** Edges of the trade's three ranges of conducted emission, cut even where a limit runs straight through them. */
const TRADE_EDGES_HZ = [500_000, 5_000_000];

export function bandKey(fromHz: number, toHz: number): string {
  return `${fromHz / 1e6}-${toHz / 1e6} MHz`;
}

/**
 * A team's own band under its name and range, such as "Radio 0.5-1.6 MHz". The range belongs to the key, so that a band whose
 * range is changed is another one: margins taken in the old range are never compared with those in the new.
 */
export function teamBand({ name, fromHz, toHz }: { name: string; fromHz: number; toHz: number }): Band {
  return { key: `${name} ${bandKey(fromHz, toHz)}`, fromHz, toHz };
}

/**
 * Cuts the range of a limit line into disjoint bands and adds the team's own.
 * The cuts are the line's own breaks and 0.5 and 5 MHz; stretches without a limit get no band.
 * @param line limit line
 * @param teamBands bands of the team, any, overlapping ones too; appended as they are
 * @returns bands rising in frequency, then the team's
 * Source: breaks from the line; 0.5 and 5 MHz are the breaks of most mains-port limits (common practice, no source).
 * Example: class A QP (one break, at 0.5 MHz) gives 0.15-0.5, 0.5-5 and 5-30 MHz.
 */
export function bandsFor(line: LimitLine, teamBands: readonly Band[] = []): Band[] {
  const edgesHz = new Set<number>();
  for (const { fromHz, toHz } of line.segments) edgesHz.add(fromHz).add(toHz);
  for (const edgeHz of TRADE_EDGES_HZ) {
    if (line.segments.some(({ fromHz, toHz }) => fromHz < edgeHz && edgeHz < toHz)) edgesHz.add(edgeHz);
  }
  const sortedHz = [...edgesHz].sort((a, b) => a - b);
  const bands: Band[] = [];
  for (let i = 0; i + 1 < sortedHz.length; i++) {
    const fromHz = sortedHz[i];
    const toHz = sortedHz[i + 1];
    const limited = line.segments.some((segment) => segment.fromHz <= fromHz && toHz <= segment.toHz);
    if (limited) bands.push({ key: bandKey(fromHz, toHz), fromHz, toHz });
  }
  return [...bands, ...teamBands];
}
