import type { SweepTags } from '@shared/contracts/sweeps';

export type TagName = keyof SweepTags;

const TAG_WORDS: Partial<Record<TagName, string>> = {
  hardware: 'hardware revision',
  firmware: 'firmware revision',
  state: 'operating state',
  unit: 'unit',
  takenAt: 'time of the measurement',
  rbwHz: 'resolution bandwidth',
  attenuationDb: 'attenuation',
  switching: 'switching stages',
};

/** What people call a tag. */
export function tagWords(tag: TagName): string {
  return TAG_WORDS[tag] ?? tag;
}
