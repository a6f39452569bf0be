import { ChangeDetectionStrategy, Component, computed, effect, inject } from '@angular/core';
import { MatButton } from '@angular/material/button';
import { MatIcon } from '@angular/material/icon';
import { MatTabsModule } from '@angular/material/tabs';
import { Title } from '@angular/platform-browser';
import { RouterLink, RouterLinkActive, RouterOutlet } from '@angular/router';
import type { IconName } from '../ui/icons';
import { PageHeader } from '../ui/page-header';
import { ProblemBanner } from '../ui/problem-banner';
import { Skeleton } from '../ui/skeleton';
import { JudgeNow } from './judge-now';
import { ProductDialogs } from './product-dialogs';
import { ProductInView } from './product-in-view';
import { ProductStanding } from './product-standing';

const TABS: readonly { path: string; label: string; icon: IconName }[] = [
  { path: 'map', label: 'Margin map', icon: 'marginMap' },
  { path: 'trend', label: 'Trend', icon: 'trend' },
  { path: 'overlay', label: 'Overlay', icon: 'sweep' },
  { path: 'builds', label: 'Builds', icon: 'table' },
  { path: 'settings', label: 'Settings', icon: 'settings' },
];

/** A product: how it stands, and below it one tab a question. */
@Component({
  selector: 'app-product-page',
  imports: [
    JudgeNow,
    MatButton,
    MatIcon,
    MatTabsModule,
    PageHeader,
    ProblemBanner,
    ProductStanding,
    RouterLink,
    RouterLinkActive,
    RouterOutlet,
    Skeleton,
  ],
  providers: [ProductDialogs, ProductInView],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './product-page.html',
  styles: `
    nav {
      margin-bottom: -4px;
    }
    .tab-icon {
      width: 18px;
      height: 18px;
      margin-inline-end: 6px;
    }
    @media (max-width: 719px) {
      .tab-icon {
        display: none;
      }
    }
  `,
})
export class ProductPage {
  protected readonly view = inject(ProductInView);
  protected readonly tabs = TABS;
  protected readonly overview = computed(() => ['/t', this.view.team(), 'overview']);
  protected readonly lead = computed(() => {
    const product = this.view.product();
    if (!product) return '';
    return product.isShared ? `Shared by ${product.teamName}, to read` : '';
  });

  constructor() {
    const title = inject(Title);
    effect(() => {
      const product = this.view.product();
      if (product) title.setTitle(`${product.name} · Strandline`);
    });
  }
}
