import type { LimitLine } from './limit-line';

/** The limit lines of one class and port of one standard. */
export interface LimitSet {
  /** Stable name in addresses and files, for example "CISPR32_B". */
  readonly key: string;
  /** Raised whenever a number in the set changes, so that old results keep naming what they were judged against. */
  readonly version: number;
  readonly title: string;
  readonly source: string;
  readonly edition: string;
  readonly note: string;
  readonly lines: readonly LimitLine[];
}
