import type { DropState } from '@shared/contracts/drop-states';
import type { DropMove } from '@shared/contracts/drops';

export type MoveTarget = DropMove['state'];

/** What a move must carry, so that the form asks for it before the server has to. */
export interface MoveNeeds {
  note: boolean;
  build: boolean;
}

export function moveNeeds(from: DropState, to: MoveTarget): MoveNeeds {
  const isReopening = from === 'fixed' || from === 'accepted';
  return { note: to === 'accepted' || isReopening, build: to === 'fixed' };
}

/** The act of a move as a button says it. */
export function moveWords(from: DropState, to: MoveTarget): string {
  if (to === 'checking') return from === 'fixed' || from === 'accepted' ? 'Open it again' : 'Check it';
  return { causeKnown: 'The cause is known', fixed: 'It is fixed', accepted: 'Accept it' }[to];
}

/** What the note of a move is about. */
export function noteLabel(from: DropState, to: MoveTarget | null): string {
  if (to === 'accepted') return 'Why it is acceptable';
  if (to === 'causeKnown') return 'The cause (optional)';
  if (to !== null && moveNeeds(from, to).note) return 'Why it is open again';
  return 'Note (optional)';
}
