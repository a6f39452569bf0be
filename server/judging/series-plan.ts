import type { Detector } from '@shared/detectors/detectors';
import { type Band, bandsFor, teamBand } from '@shared/limits/bands';
import type { LimitLine } from '@shared/limits/limit-line';
import type { LimitSet } from '@shared/limits/limit-set';
import { findLimitSet, lineForDetector } from '@shared/limits/limit-sets';

interface NamedBand {
  readonly name: string;
  readonly fromHz: number;
  readonly toHz: number;
}

/** What the sweeps of a detector are held against in the product's limit plan. */
export interface SeriesPlan {
  readonly limitLineKey: string;
  readonly line: LimitLine;
  /** Bands of the line, then the team's. */
  readonly bands: readonly Band[];
}

/** @throws Error when the plan names a set this program does not have, or one without a line for the detector */
export function seriesPlan(limitSetKey: string, detector: Detector, teamBands: readonly NamedBand[]): SeriesPlan {
  const set = planSet(limitSetKey);
  const line = lineForDetector(set, detector);
  if (line === undefined) throw new Error(`the limit set ${limitSetKey} has no line for ${detector} readings`);
  const bands = bandsFor(line, teamBands.map(teamBand));
  return { limitLineKey: limitLineKey(limitSetKey, set.version, detector), line, bands };
}

/** @throws Error when this program has no such set */
export function planSet(limitSetKey: string): LimitSet {
  const set = findLimitSet(limitSetKey);
  if (set === undefined) throw new Error(`there is no limit set ${limitSetKey} in this program`);
  return set;
}

/**
 * Names the limit line a margin was taken to. Two margins are comparable only under the same name, so that an outdated
 * version of a set is named with its number.
 */
export function limitLineKey(limitSetKey: string, version: number, detector: Detector): string {
  const set = findLimitSet(limitSetKey);
  const line = set && lineForDetector(set, detector);
  const key = `${limitSetKey}/${line?.detector ?? detector}`;
  return set?.version === version ? key : `${key} (version ${version})`;
}
