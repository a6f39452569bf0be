import type { BatchTags } from '@shared/contracts/imports';
import type { DraftFile } from './draft-file';

export interface TakenAt {
  /** ISO 8601, UTC; undefined: the time of saving. */
  readonly takenAt: string | undefined;
  readonly isFromFile: boolean;
}

/** When a file was measured: as the person says, for it or for all, and only where nobody says, as the file itself does. */
export function takenAtOf({ choice, reading }: DraftFile, common: BatchTags): TakenAt {
  const typed = choice.takenAt ?? common.takenAt;
  const stated = reading?.takenAt ?? undefined;
  return typed === undefined
    ? { takenAt: stated, isFromFile: stated !== undefined }
    : { takenAt: typed, isFromFile: false };
}
