import type { MemberView, PendingInvitation } from '@shared/contracts/teams';
import { isoTime } from '../iso-time';
import type { Invitation } from './invitation-store';
import type { Member } from './member-store';

export function presentMember({ personId, name, email, role, createdAt }: Member): MemberView {
  return { personId, name, email, role, since: isoTime(createdAt) };
}

export function presentInvitation(invitation: Invitation, invitedBy: string): PendingInvitation {
  const { id, email, role, createdAt, expiresAt } = invitation;
  return { id, email, role, invitedBy, createdAt: isoTime(createdAt), expiresAt: isoTime(expiresAt) };
}
