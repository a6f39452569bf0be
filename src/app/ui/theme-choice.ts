import { computed, effect, inject, Injectable, signal } from '@angular/core';
import { toSignal } from '@angular/core/rxjs-interop';
import { BreakpointObserver } from '@angular/cdk/layout';
import { map } from 'rxjs';

export type Theme = 'system' | 'light' | 'dark';

/** Also read by src/public/first-theme.js before the first paint. */
const STORAGE_KEY = 'strandline.theme';

/** Light or dark: the system's until the person chooses, then theirs, kept in this browser. */
@Injectable({ providedIn: 'root' })
export class ThemeChoice {
  private readonly systemIsDark = toSignal(
    inject(BreakpointObserver)
      .observe('(prefers-color-scheme: dark)')
      .pipe(map(({ matches }) => matches)),
    { initialValue: false },
  );

  readonly choice = signal<Theme>(storedTheme());
  readonly isDark = computed(() => {
    const choice = this.choice();
    return choice === 'system' ? this.systemIsDark() : choice === 'dark';
  });

  constructor() {
    effect(() => show(this.choice()));
  }

  choose(theme: Theme): void {
    if (theme === 'system') localStorage.removeItem(STORAGE_KEY);
    else localStorage.setItem(STORAGE_KEY, theme);
    // The classes change before the signal so that charts, which follow it, read the new colours.
    show(theme);
    this.choice.set(theme);
  }
}

function show(theme: Theme): void {
  const { classList } = document.documentElement;
  classList.toggle('theme-light', theme === 'light');
  classList.toggle('theme-dark', theme === 'dark');
}

function storedTheme(): Theme {
  const stored = localStorage.getItem(STORAGE_KEY);
  return stored === 'light' || stored === 'dark' ? stored : 'system';
}
