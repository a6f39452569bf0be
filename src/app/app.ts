import { ChangeDetectionStrategy, Component } from '@angular/core';
import { RouterOutlet } from '@angular/router';
import { NavigationProgress } from './shell/navigation-progress';

@Component({
  selector: 'app-root',
  imports: [NavigationProgress, RouterOutlet],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <app-navigation-progress />
    <router-outlet />
  `,
})
export class App {}
