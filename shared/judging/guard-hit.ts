export const GUARD_CODES = ['constantOffset', 'detectorOrder', 'sameDayShift'] as const;

export type GuardCode = (typeof GUARD_CODES)[number];

/** A sign that the bench moved and not the product. `text` is one plain sentence with its numbers. */
export interface GuardHit {
  readonly code: GuardCode;
  readonly text: string;
}
