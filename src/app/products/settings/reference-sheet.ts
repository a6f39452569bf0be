import { ChangeDetectionStrategy, Component, inject, input } from '@angular/core';
import { MatButton } from '@angular/material/button';
import { RouterLink } from '@angular/router';
import type { ProductView } from '@shared/contracts/products';
import { CurrentTeam } from '../../session/current-team';
import { TimeStamp } from '../../ui/time-stamp';
import { ProductDialogs } from '../product-dialogs';
import { ProductInView } from '../product-in-view';
import { ReferenceHistory } from './reference-history';

/** Which build others are judged against, who chose it and why; for leads with the choices before. */
@Component({
  selector: 'app-reference-sheet',
  imports: [MatButton, ReferenceHistory, RouterLink, TimeStamp],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <section class="sheet" aria-labelledby="reference-title">
      <h2 id="reference-title">Reference</h2>
      @if (product().reference; as reference) {
        <dl>
          <dt>Build</dt>
          <dd>
            <a [routerLink]="view.link().concat('builds', '' + reference.buildId)" [queryParams]="view.linkQuery()"
              >{{ reference.hardware }} / {{ reference.firmware }}</a
            >
          </dd>
          <dt>Chosen</dt>
          <dd><app-time [at]="reference.chosenAt" /> by {{ reference.chosenBy }}</dd>
          <dt>Reason</dt>
          <dd>{{ reference.reason }}</dd>
        </dl>
      } @else {
        <p>No build is chosen: each build is judged against the pooled mean of the latest builds judged held.</p>
      }
      <p class="muted small">A build is chosen in the list of builds or on its page.</p>
      @if (product().reference && view.may('references.choose')) {
        <div class="form-actions">
          <button mat-stroked-button type="button" (click)="clear()">Compare with builds judged held instead</button>
        </div>
      }
      @if (!view.isShared() && team.may('audit.read')) {
        <app-reference-history [chosenAt]="product().reference?.chosenAt ?? ''" />
      }
    </section>
  `,
  styleUrl: './sheet.scss',
})
export class ReferenceSheet {
  private readonly dialogs = inject(ProductDialogs);
  protected readonly team = inject(CurrentTeam);
  protected readonly view = inject(ProductInView);

  readonly product = input.required<ProductView>();

  protected async clear(): Promise<void> {
    if (await this.dialogs.chooseReference(null)) this.view.reload();
  }
}
