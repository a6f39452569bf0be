import { BreakpointObserver } from '@angular/cdk/layout';
import { inject, Signal } from '@angular/core';
import { toSignal } from '@angular/core/rxjs-interop';
import { map } from 'rxjs';

export type ShellWidth = 'phone' | 'laptop' | 'desk';

const PHONE = '(max-width: 839.98px)';
/** The bench laptop (1280 x 720) keeps its width for the charts. */
const LAPTOP = '(min-width: 840px) and (max-width: 1359.98px)';

/** Which of the three arrangements of the shell fits the window; called in an injection context. */
export function shellWidth(): Signal<ShellWidth> {
  return toSignal(
    inject(BreakpointObserver)
      .observe([PHONE, LAPTOP])
      .pipe(map(({ breakpoints }) => (breakpoints[PHONE] ? 'phone' : breakpoints[LAPTOP] ? 'laptop' : 'desk'))),
    { initialValue: 'desk' },
  );
}
