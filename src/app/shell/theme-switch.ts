import { ChangeDetectionStrategy, Component, computed, inject } from '@angular/core';
import { MatIconButton } from '@angular/material/button';
import { MatIcon } from '@angular/material/icon';
import { MatMenuModule } from '@angular/material/menu';
import { MatTooltip } from '@angular/material/tooltip';
import type { IconName } from '../ui/icons';
import { ThemeChoice, type Theme } from '../ui/theme-choice';

const THEMES: readonly { theme: Theme; label: string; icon: IconName }[] = [
  { theme: 'system', label: 'As the system', icon: 'themeSystem' },
  { theme: 'light', label: 'Light', icon: 'themeLight' },
  { theme: 'dark', label: 'Dark', icon: 'themeDark' },
];

@Component({
  selector: 'app-theme-switch',
  imports: [MatIcon, MatIconButton, MatMenuModule, MatTooltip],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <button
      mat-icon-button
      type="button"
      [matMenuTriggerFor]="menu"
      [attr.aria-label]="'Theme: ' + current().label"
      matTooltip="Light or dark"
    >
      <mat-icon [svgIcon]="current().icon" />
    </button>
    <mat-menu #menu="matMenu">
      @for (option of themes; track option.theme) {
        <button
          mat-menu-item
          type="button"
          role="menuitemradio"
          [attr.aria-checked]="option === current()"
          (click)="choice.choose(option.theme)"
        >
          <mat-icon [svgIcon]="option === current() ? 'check' : option.icon" />
          <span>{{ option.label }}</span>
        </button>
      }
    </mat-menu>
  `,
})
export class ThemeSwitch {
  protected readonly choice = inject(ThemeChoice);
  protected readonly themes = THEMES;
  protected readonly current = computed(
    () =>
      THEMES.find(({ theme }) => theme === this.choice.choice()) ?? { theme: 'system', label: '', icon: 'themeSystem' },
  );
}
