import type { DropSummary } from '@shared/contracts/drops';
import type { DropFilter } from './drop-filter';
import { isOverNow } from './sighting-words';

/** What a lead can repeat about the list: "9 open drops, 4 of them over the limit, 6 without an owner." */
export function dropsSentence(drops: readonly DropSummary[], { state }: DropFilter): string {
  const count = drops.length;
  const isOpen = state === 'open';
  if (count === 0) return isOpen ? 'No drop is open.' : 'No drop fits this choice.';
  const over = drops.filter(isOverNow).length;
  const unowned = drops.filter(({ owner }) => owner === null).length;
  const parts = [
    `${count} ${isOpen ? 'open ' : ''}${count === 1 ? 'drop' : 'drops'}`,
    over === 0 ? '' : `${share(over, count)}over the limit`,
    isOpen && unowned > 0 ? `${share(unowned, count)}without an owner` : '',
  ];
  return `${parts.filter(Boolean).join(', ')}.`;
}

function share(part: number, count: number): string {
  if (count === 1) return '';
  return part === count ? (count === 2 ? 'both ' : 'all ') : `${part} of them `;
}
