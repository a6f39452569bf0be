import { ChangeDetectionStrategy, Component, computed, inject, input } from '@angular/core';
import { MatButton } from '@angular/material/button';
import { RouterLink } from '@angular/router';
import { EmptyState } from '../ui/empty-state';
import { AddressQuery } from './address-query';
import { ProductInView } from './product-in-view';

/** Stands where a chart has nothing to show, and leads to what would fill it. */
@Component({
  selector: 'app-nothing-measured',
  imports: [EmptyState, MatButton, RouterLink],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <app-empty-state icon="unmeasured" [heading]="heading()" [text]="text()">
      @if (hasSweeps()) {
        <button mat-stroked-button type="button" (click)="showAll()">Show all series</button>
      } @else if (view.may('sweeps.add')) {
        <a mat-flat-button [routerLink]="['/t', view.team(), 'import']" [queryParams]="{ product: view.key() }"
          >Import sweeps</a
        >
      }
    </app-empty-state>
  `,
})
export class NothingMeasured {
  private readonly address = inject(AddressQuery);
  protected readonly view = inject(ProductInView);

  /** The series that were asked for, in words. */
  readonly words = input.required<string>();

  protected readonly hasSweeps = computed(() => this.view.isMeasured() ?? false);
  protected readonly heading = computed(() => (this.hasSweeps() ? 'Not measured in this series' : 'Not measured yet'));
  protected readonly text = computed(() =>
    this.hasSweeps()
      ? `No build has a sweep for: ${this.words()}.`
      : `Margins show as soon as the first sweep of the product is imported. ${this.view.whyNot('sweeps.add')}`,
  );

  protected showAll(): void {
    this.address.patch({ state: null, line: null, detector: null, band: null });
  }
}
