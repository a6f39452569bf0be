import type { SweepTags } from '@shared/contracts/sweeps';
import { sha256 } from './original-files';

/**
 * What makes two uploads one sweep: the same bytes with the same tags. Tags are compared after defaults are filled in,
 * whatever order they came in, times as moments; product and team are left to the index.
 */
export function sweepIdentity(originalSha256: string, tags: SweepTags): string {
  const canonical = { ...tags, takenAt: tags.takenAt === undefined ? undefined : Date.parse(tags.takenAt) };
  const entries = Object.entries(canonical).filter(([, value]) => value !== undefined);
  entries.sort(([a], [b]) => (a < b ? -1 : 1));
  return sha256(Buffer.from(JSON.stringify([originalSha256, entries])));
}
