import { inject } from '@angular/core';
import { CanDeactivateFn } from '@angular/router';
import { Confirm } from '../ui/confirm';

/** A page that may hold what is not saved yet. */
export interface HoldsUnsaved {
  /** What would be lost, in one sentence; null when nothing would. */
  unsaved(): string | null;
}

/** Asks before a page is left that holds what is not saved. */
export const keepUnsaved: CanDeactivateFn<HoldsUnsaved> = (page) => {
  const text = page.unsaved();
  return text === null || inject(Confirm).ask({ title: 'Leave without saving?', text, action: 'Leave the page' });
};
