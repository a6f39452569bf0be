import type { DropState } from '@shared/contracts/drop-states';
import type { IconName } from '../ui/icons';

/** Glyph of every state of a drop, and the status whose colours it borrows; the word stands in the contract. */
export const DROP_STATE_LOOKS: Record<
  DropState,
  { icon: IconName; tone: 'alarm' | 'work' | 'good' | 'calm' | 'gone' }
> = {
  new: { icon: 'drop', tone: 'alarm' },
  checking: { icon: 'search', tone: 'work' },
  causeKnown: { icon: 'wrench', tone: 'work' },
  fixed: { icon: 'check', tone: 'good' },
  accepted: { icon: 'note', tone: 'calm' },
  withdrawn: { icon: 'undo', tone: 'gone' },
};
