import type { SweepKind } from '@shared/detectors/detectors';

/** What people call the kinds of a sweep. */
export const KIND_WORDS: Readonly<Record<SweepKind, string>> = {
  product: 'Product',
  background: 'Background',
  checkSource: 'Check source',
};
