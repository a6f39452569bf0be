export const DROP_STATES = ['new', 'checking', 'causeKnown', 'fixed', 'accepted', 'withdrawn'] as const;
export type DropState = (typeof DROP_STATES)[number];
/** States in which somebody still has to act. */
export const OPEN_DROP_STATES = ['new', 'checking', 'causeKnown'] as const satisfies readonly DropState[];
export const DROP_STATE_WORDS: Record<DropState, string> = {
  new: 'new',
  checking: 'being checked',
  causeKnown: 'cause known',
  fixed: 'fixed',
  accepted: 'accepted',
  withdrawn: 'withdrawn',
};
