import type { BatchItemTags, BatchTags } from '@shared/contracts/imports';
import { DraftFile, statedDetector, statedLine } from './draft-file';
import { takenAtOf } from './taken-at-of';

/**
 * The tags that one trace adds to the common ones. The nearest word wins: trace, file, what the file itself says, common.
 * State, line, detector and kind are always among them, so that the batch can say what each item is.
 */
export function traceTags(file: DraftFile, index: number, common: BatchTags): BatchItemTags {
  const read = file.reading?.traces[index];
  const choice = file.traces[index];
  if (read === undefined || choice === undefined) throw new RangeError(`${file.file.name} has no trace ${index + 1}`);
  const { state = common.state, kind = common.kind, ...ofFile } = file.choice;
  return withoutGaps({
    trace: read.trace,
    state,
    line: choice.line ?? statedLine(read) ?? common.line,
    detector: choice.detector ?? statedDetector(read) ?? common.detector,
    kind: choice.kind ?? kind ?? 'product',
    ...ofFile,
    takenAt: takenAtOf(file, common).takenAt,
    ...file.units,
  });
}

/** Leaves out what is undefined, which would hide a common tag. */
export function withoutGaps<T extends object>(tags: T): T {
  return Object.fromEntries(Object.entries(tags).filter(([, content]) => content !== undefined)) as T;
}
