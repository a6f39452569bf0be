import { ChangeDetectionStrategy, Component, inject } from '@angular/core';
import { toSignal } from '@angular/core/rxjs-interop';
import { NavigationCancel, NavigationEnd, NavigationError, NavigationStart, Router } from '@angular/router';
import { debounce, filter, map, startWith, timer } from 'rxjs';
import { ProgressLine } from '../ui/progress-line';

/** A thin line at the top while a page is on its way; quick page changes show nothing. */
@Component({
  selector: 'app-navigation-progress',
  imports: [ProgressLine],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    @if (busy()) {
      <app-progress-line label="Loading the page" />
    }
  `,
  styles: `
    app-progress-line {
      position: fixed;
      inset: 0 0 auto;
      z-index: 1000;
    }
  `,
})
export class NavigationProgress {
  protected readonly busy = toSignal(
    inject(Router).events.pipe(
      filter(
        (event) =>
          event instanceof NavigationStart ||
          event instanceof NavigationEnd ||
          event instanceof NavigationCancel ||
          event instanceof NavigationError,
      ),
      map((event) => event instanceof NavigationStart),
      debounce((started) => timer(started ? 150 : 0)),
      startWith(false),
    ),
    { initialValue: false },
  );
}
