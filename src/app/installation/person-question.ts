import type { ConfirmQuestion } from '../ui/confirm-dialog';
import type { PersonChange } from './person-change';

/** What is asked before a change that takes something away; null for one that gives or gives back. */
export function personQuestion(change: PersonChange, myId: number): ConfirmQuestion | null {
  const { name, id } = change.person;
  if (change.kind === 'leave') {
    return {
      title: `Take ${name} out of ${change.teamName}?`,
      text: 'Access to everything of the team ends at once. The account stays, and so does the history.',
      action: 'Take out of the team',
    };
  }
  if (change.kind === 'role') return null;
  if (change.patch.isDisabled) {
    return {
      title: `Disable the account of ${name}?`,
      text: 'The person is signed out everywhere and cannot sign in. Teams, drops and history stay; you can enable it again.',
      action: 'Disable the account',
    };
  }
  if (change.patch.isAdministrator === false && id === myId) {
    return {
      title: 'Give up being an administrator?',
      text: 'You lose this page at once; only another administrator can give it back to you.',
      action: 'Give it up',
    };
  }
  if (change.patch.isAdministrator) {
    return {
      title: `Make ${name} an administrator?`,
      text: 'Administrators make and archive teams and change every account of this installation.',
      action: 'Make administrator',
    };
  }
  return null;
}
