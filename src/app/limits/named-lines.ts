import type { LimitSetView } from '@shared/contracts/limits';
import { limitAt, type LimitLine } from '@shared/limits/limit-line';
import type { SpectrumLimit } from '../ui/chart/spectrum-types';

/**
 * The lines of sets with what is written at their right ends. Lines that lie on each other there share one
 * name, "CISPR 32 class A, AV and CISPR 32 class B, QP", where two would be written over each other.
 */
export function namedLines(sets: readonly LimitSetView[], rightEndHz: number): SpectrumLimit[] {
  const lines = sets.flatMap((set) =>
    set.lines.map((one) => {
      const line = one as LimitLine;
      const endHz = Math.min(rightEndHz, line.segments.at(-1)?.toHz ?? rightEndHz);
      return { line, name: `${shortTitle(set)}, ${line.detector}`, place: `${endHz} ${limitAt(line, endHz)}` };
    }),
  );
  return lines.map(({ line, name, place }, index) => {
    const together = lines.filter((other) => other.place === place);
    const isFirst = lines.findIndex((other) => other.place === place) === index;
    return { line, name, written: isFirst ? together.map((other) => other.name).join(' and ') : '' };
  });
}

/** The title without its port, which the card of the set names in full. */
function shortTitle({ title }: LimitSetView): string {
  return title.split(',')[0] ?? title;
}
