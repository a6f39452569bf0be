import type { Context } from '../context';
import { queueMail } from '../mail/queue-mail';
import { renderLetter } from '../mail/render-letter';
import type { Invitation } from './invitation-store';
import type { Team } from './team-store';

/** Mails the link of an invitation. */
export function mailInvitation(
  context: Context,
  { team, invitation, secret, inviter }: { team: Team; invitation: Invitation; secret: string; inviter: string },
): void {
  const letter = renderLetter({
    heading: `Join ${team.name}`,
    paragraphs: [
      `${inviter} invites you to the team ${team.name} on Strandline as ${invitation.role}.`,
      'Strandline keeps the conducted-emission sweeps of every build and says which build lost margin, where and why.',
      'The link works once, within seven days.',
    ],
    link: { label: 'Accept the invitation', url: `${context.config.publicUrl}/invitation/${secret}` },
    footer: 'If you do not know what this is about, ignore this mail: nothing happens without you.',
  });
  queueMail(context, {
    teamId: team.id,
    kind: 'invitation',
    onceKey: `invitation:${invitation.tokenHash}`,
    toEmail: invitation.email,
    subject: `Invitation to ${team.name} on Strandline`,
    ...letter,
  });
}
