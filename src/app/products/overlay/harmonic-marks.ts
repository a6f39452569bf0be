import type { SwitchingStage } from '@shared/contracts/switching';
import type { SpectrumMark } from '../../ui/chart/spectrum-types';

/** More lines than this hide the traces. */
const MOST_MARKS = 24;

/** The harmonics of a stage in view, lowest first; none where they would stand too close to tell apart. */
export function harmonicMarks(
  { stage, frequencyHz }: Pick<SwitchingStage, 'stage' | 'frequencyHz'>,
  view: { fromHz: number; toHz: number },
): SpectrumMark[] {
  const first = Math.max(1, Math.ceil(view.fromHz / frequencyHz));
  const last = Math.min(Math.floor(view.toHz / frequencyHz), first + MOST_MARKS - 1);
  return Array.from({ length: Math.max(0, last - first + 1) }, (_, i) => ({
    frequencyHz: (first + i) * frequencyHz,
    label: `${stage} n=${first + i}`,
  }));
}
