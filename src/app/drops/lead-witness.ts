import type { DropEvidence, DropView, DropWitness } from '@shared/contracts/drops';
import { buildName } from './sighting-words';

/** The witness the drop is described by: the one with the least margin left. */
export function leadWitness({ evidence }: Pick<DropView, 'evidence'>): DropWitness {
  return evidence.witnesses[0];
}

/** "C2 / 3.6.2", or "5 builds, the latest C2 / 3.6.2". */
export function referenceName({ referenceBuilds }: Pick<DropEvidence, 'referenceBuilds'>): string {
  const latest = referenceBuilds.at(-1);
  if (latest === undefined) return 'no build';
  const name = buildName(latest);
  return referenceBuilds.length === 1 ? name : `${referenceBuilds.length} builds, the latest ${name}`;
}

export function seriesName({ line, detector }: { line: string; detector: string }): string {
  return `${line} ${detector}`;
}
