import { ChangeDetectionStrategy, Component, inject } from '@angular/core';
import { MatIcon } from '@angular/material/icon';
import { Skeleton } from '../../ui/skeleton';
import { ProductInView } from '../product-in-view';
import { ProductForm } from './product-form';
import { ReferenceSheet } from './reference-sheet';
import { ShareSheet } from './share-sheet';
import { StateSheet } from './state-sheet';

/** What a lead decides about a product; everybody else reads it, with the reason. */
@Component({
  selector: 'app-settings-tab',
  imports: [MatIcon, ProductForm, ReferenceSheet, ShareSheet, Skeleton, StateSheet],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    @if (view.product(); as product) {
      @if (view.whyNot('products.edit'); as reason) {
        <p class="muted"><mat-icon class="inline-icon" svgIcon="info" /> To read: {{ reason }}</p>
      }
      <div class="columns">
        <div class="column">
          <app-product-form [product]="product" />
          <app-reference-sheet [product]="product" />
        </div>
        <div class="column">
          <app-state-sheet [product]="product" />
          @if (!view.isShared()) {
            <app-share-sheet [product]="product" />
          }
        </div>
      </div>
    } @else {
      <app-skeleton label="Loading the settings" [heightPx]="420" />
    }
  `,
  styles: `
    :host {
      display: grid;
      gap: 12px;
      padding-top: 4px;
    }
    .columns {
      display: grid;
      gap: 16px;
      grid-template-columns: minmax(0, 2fr) minmax(0, 3fr);
      align-items: start;
    }
    .column {
      display: grid;
      gap: 16px;
      min-width: 0;
    }
    @media (max-width: 1099.98px) {
      .columns {
        grid-template-columns: minmax(0, 1fr);
      }
    }
  `,
})
export class SettingsTab {
  protected readonly view = inject(ProductInView);
}
