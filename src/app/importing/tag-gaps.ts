import '../ui/zod-without-eval';
import { SweepTags } from '@shared/contracts/sweeps';
import { type TagName, tagWords } from './tag-words';

/** A tag that keeps a trace from being imported. */
export interface Gap {
  readonly tag: TagName;
  /** What is wrong with what is there; empty when nothing is there. */
  readonly fault: string;
}

/** What a set of tags lacks, and what in it does not fit, by the rule that the server checks it with. */
export function gapsOf(tags: Readonly<Record<string, unknown>>): Gap[] {
  const { error } = SweepTags.safeParse(tags);
  const gaps = new Map<TagName, Gap>();
  for (const { path, message } of error?.issues ?? []) {
    const tag = path[0] as TagName;
    if (!gaps.has(tag)) gaps.set(tag, { tag, fault: tags[tag] === undefined ? '' : message });
  }
  return [...gaps.values()];
}

/** "hardware revision; detector of 2 traces": what is missing before all can be saved, worst first. */
export function missingWords(traces: readonly { readonly gaps: readonly Gap[] }[]): string[] {
  const counts = new Map<string, number>();
  for (const { tag, fault } of traces.flatMap(({ gaps }) => gaps)) {
    const words = fault === '' ? tagWords(tag) : `${tagWords(tag)} (${fault})`;
    counts.set(words, (counts.get(words) ?? 0) + 1);
  }
  return [...counts]
    .sort(([, a], [, b]) => b - a)
    .map(([words, count]) => {
      if (count === traces.length) return words;
      return `${words} of ${count === 1 ? 'one trace' : `${count} traces`}`;
    });
}
