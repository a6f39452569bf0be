import type { Role } from '@shared/access/roles';
import type { DropView } from '@shared/contracts/drops';

/** Why the reader cannot move a drop, in a sentence; null when they can. */
export function whyNoMoves(
  { moves, state, team }: Pick<DropView, 'moves' | 'state' | 'team'>,
  reader: { team: string; teamName: string; role: Role | undefined; mayTriage: boolean },
): string | null {
  if (team !== reader.team) {
    return 'The product belongs to another team, which shares it with yours to read; its engineers and leads act.';
  }
  if (!reader.mayTriage) {
    return `You read ${reader.teamName} as ${reader.role}. Its engineers and leads move drops and give them an owner.`;
  }
  if (moves.length > 0) return null;
  return state === 'withdrawn'
    ? 'The data no longer support this drop, so it needs nobody. It opens by itself should they support it again.'
    : 'It cannot be moved from here.';
}
