import { CdkTrapFocus } from '@angular/cdk/a11y';
import { ChangeDetectionStrategy, Component, computed, ElementRef, linkedSignal, viewChild } from '@angular/core';
import { RouterOutlet } from '@angular/router';
import { shellWidth } from './shell-width';
import { SideNavigation } from './side-navigation';
import { TopBar } from './top-bar';

/** Top bar, side navigation and footer around the page; the navigation is a list, a strip of icons or a drawer. */
@Component({
  selector: 'app-shell',
  imports: [CdkTrapFocus, RouterOutlet, SideNavigation, TopBar],
  changeDetection: ChangeDetectionStrategy.OnPush,
  host: { '[class]': 'width()', '(keydown.escape)': 'closeDrawer()' },
  templateUrl: './shell.html',
  styleUrl: './shell.scss',
})
export class Shell {
  protected readonly width = shellWidth();
  /** Whether the navigation shows its words; starts anew when the arrangement changes. */
  protected readonly isOpen = linkedSignal(() => this.width() === 'desk');
  protected readonly isDrawer = computed(() => this.width() === 'phone');
  protected readonly isNarrow = computed(() => !this.isDrawer() && !this.isOpen());

  private readonly content = viewChild.required<ElementRef<HTMLElement>>('content');

  protected toggle(): void {
    this.isOpen.update((open) => !open);
  }

  protected closeDrawer(): void {
    if (this.isDrawer()) this.isOpen.set(false);
  }

  protected skipToContent(event: Event): void {
    event.preventDefault();
    this.content().nativeElement.focus();
  }
}
