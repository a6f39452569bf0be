import { groupBy } from '@shared/collections/group-by';
import type { PlannedTrace } from './plan-import';

/** Traces of one file that would be saved as the same thing: seldom meant, and easily done by common tags. */
export function alikeTraces(planned: readonly PlannedTrace[]): string[] {
  const complete = planned.filter(({ tags }) => tags.line && tags.detector);
  const groups = groupBy(complete, ({ tags }) => [tags.line, tags.detector, tags.kind].join(' '));
  return [...groups.values()]
    .filter((traces) => traces.length > 1)
    .map((traces) => {
      const [{ tags }] = traces;
      const numbers = traces.map(({ index }) => index + 1);
      const named = `${numbers.slice(0, -1).join(', ')} and ${numbers.at(-1)}`;
      return `Traces ${named} are ${traces.length === 2 ? 'both' : 'all'} ${tags.line} ${tags.detector}. Leave out what is not another run of the same.`;
    });
}
