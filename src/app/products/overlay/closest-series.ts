import type { SweepView } from '@shared/contracts/sweeps';
import type { SeriesChoice } from '../series-choice';

/**
 * The series with the least margin among sweeps, within a choice. PK readings count only where nothing else was
 * measured: they are held against the QP line, which they can only overstate (common practice, no source).
 */
export function closestSeries(sweeps: readonly SweepView[], choice: SeriesChoice): Required<SeriesChoice> | null {
  const inside = sweeps.filter(
    ({ kind, state, line, detector }) =>
      kind === 'product' &&
      (choice.state ?? state) === state &&
      (choice.line ?? line) === line &&
      (choice.detector ?? detector) === detector,
  );
  const judged = inside.filter(({ detector }) => detector !== 'PK');
  const candidates = judged.length > 0 ? judged : inside;
  if (candidates.length === 0) return null;
  const marginOf = ({ worst }: SweepView) => worst?.marginDb ?? Infinity;
  const { state, line, detector } = candidates.reduce((least, one) => (marginOf(one) < marginOf(least) ? one : least));
  return { state, line, detector };
}
