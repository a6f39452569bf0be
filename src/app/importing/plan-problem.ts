import type { Problem } from '@shared/contracts/problem';
import type { PlannedTrace } from './plan-import';
import { type TagName, tagWords } from './tag-words';

/**
 * A refused plan in the person's words: the server names items by number (`items.3.tags.state`), the page by file and trace.
 */
export function explainPlanProblem(problem: Problem, traces: readonly PlannedTrace[]): Problem {
  const errors = (problem.errors ?? []).map(({ path, message }) => {
    const [, item, tag] = /^items\.(\d+)\.tags\.(\w+)/.exec(path) ?? [];
    const trace = traces[Number(item)];
    if (item === undefined || trace === undefined) return { path, message };
    return { path: `${trace.fileName}, trace ${trace.index + 1}, ${tagWords(tag as TagName)}`, message };
  });
  if (errors.length === 0) return problem;
  return { ...problem, detail: 'The server did not take these tags.', errors };
}
