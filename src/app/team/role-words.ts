import type { Role } from '@shared/access/roles';

/** What a role may do beyond the one before it. */
export const ROLE_WORDS: Record<Role, string> = {
  viewer: 'reads everything of the team',
  technician: 'also adds sweeps and describes builds',
  engineer: 'also triages drops, edits benches, removes sweeps',
  lead: 'also chooses references, sets the team, digest, members and tokens',
};
