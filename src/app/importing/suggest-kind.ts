import type { SweepKind } from '@shared/detectors/detectors';

const BACKGROUND = /background|ambient|(eut|dut|device)[ _-]*off/i;

/** The role that the name of a file or trace points to; a proposal that the page shows and the person can change. */
export function suggestKind(name: string): SweepKind | undefined {
  if (BACKGROUND.test(name)) return 'background';
  return /check[ _-]*source|comb[ _-]*generator/i.test(name) ? 'checkSource' : undefined;
}
