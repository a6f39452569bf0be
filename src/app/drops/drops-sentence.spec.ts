import type { DropSummary } from '@shared/contracts/drops';
import { dropsSentence } from './drops-sentence';

const OPEN = { state: 'open', product: null, owner: null };
const drop = (isOverLimit: boolean, isOwned: boolean) =>
  ({ latest: { isOverLimit }, noLongerSeenIn: null, owner: isOwned ? { id: 3, name: 'Ivo' } : null }) as DropSummary;

it.each([
  [[], 'No drop is open.'],
  [[drop(false, true)], '1 open drop.'],
  [[drop(true, false)], '1 open drop, over the limit, without an owner.'],
  [[drop(true, false), drop(false, false)], '2 open drops, 1 of them over the limit, both without an owner.'],
  [
    [drop(true, true), drop(true, false), drop(true, true)],
    '3 open drops, all over the limit, 1 of them without an owner.',
  ],
])('sums up the open drops: case %#', (drops, sentence) => {
  expect(dropsSentence(drops, OPEN)).toBe(sentence);
});

it('does not ask for an owner of drops that are closed', () => {
  expect(dropsSentence([drop(false, false), drop(true, false)], { ...OPEN, state: 'fixed' })).toBe(
    '2 drops, 1 of them over the limit.',
  );
});

it('does not call a drop over the limit once the margin is back', () => {
  const back = { ...drop(true, true), noLongerSeenIn: { id: 19, hardware: 'C3', firmware: '4.2.1' } };
  expect(dropsSentence([back], { ...OPEN, state: 'all' })).toBe('1 drop.');
});
