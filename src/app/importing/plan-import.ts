import type { BatchTags, ImportPlan } from '@shared/contracts/imports';
import type { DraftFile } from './draft-file';
import { traceTags } from './merge-tags';
import { type Gap, gapsOf } from './tag-gaps';

/** A trace that will be imported, with what still stands in its way. */
export interface PlannedTrace {
  readonly fileId: number;
  readonly fileName: string;
  /** Place of the trace in its file, from 0. */
  readonly index: number;
  readonly tags: ImportPlan['items'][number]['tags'];
  readonly gaps: readonly Gap[];
}

/** Every trace of every readable file that is not left out. */
export function plannedTraces(files: readonly DraftFile[], common: BatchTags): PlannedTrace[] {
  return files.flatMap((file) =>
    file.traces.flatMap(({ isLeftOut }, index) => {
      if (isLeftOut) return [];
      const tags = traceTags(file, index, common);
      const gaps = gapsOf({ ...common, ...tags });
      return [{ fileId: file.id, fileName: file.file.name, index, tags, gaps }];
    }),
  );
}

export interface Upload {
  readonly files: readonly File[];
  readonly plan: ImportPlan;
}

/** What goes to the server: only files with a trace to import, each once, and the plan that names them by their place. */
export function uploadOf(files: readonly DraftFile[], traces: readonly PlannedTrace[], common: BatchTags): Upload {
  const used = files.filter(({ id }) => traces.some(({ fileId }) => fileId === id));
  const places = new Map(used.map(({ id }, place) => [id, place]));
  return {
    files: used.map(({ file }) => file),
    plan: {
      tags: common,
      items: traces.map(({ fileId, tags }) => ({ file: places.get(fileId) ?? 0, tags })),
    },
  };
}
