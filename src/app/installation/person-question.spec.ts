import type { PersonView } from '@shared/contracts/teams';
import { personQuestion } from './person-question';

const person = { id: 7, name: 'Caspar Lindreth' } as PersonView;

it('asks before it takes access away, and before it makes an administrator', () => {
  const asked = [
    personQuestion({ person, kind: 'leave', team: 'drives', teamName: 'Drives' }, 1)?.title,
    personQuestion({ person, kind: 'account', patch: { isDisabled: true } }, 1)?.title,
    personQuestion({ person, kind: 'account', patch: { isAdministrator: true } }, 1)?.title,
    personQuestion({ person, kind: 'account', patch: { isAdministrator: false } }, 7)?.title,
  ];
  expect(asked).toEqual([
    'Take Caspar Lindreth out of Drives?',
    'Disable the account of Caspar Lindreth?',
    'Make Caspar Lindreth an administrator?',
    'Give up being an administrator?',
  ]);
});

it('does not ask for a role, an account given back, or another administrator stepping down', () => {
  expect(personQuestion({ person, kind: 'role', team: 'drives', role: 'lead' }, 1)).toBeNull();
  expect(personQuestion({ person, kind: 'account', patch: { isDisabled: false } }, 1)).toBeNull();
  expect(personQuestion({ person, kind: 'account', patch: { isAdministrator: false } }, 1)).toBeNull();
});
