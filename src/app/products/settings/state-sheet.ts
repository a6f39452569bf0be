import { ChangeDetectionStrategy, Component, inject, input } from '@angular/core';
import { MatButton, MatIconButton } from '@angular/material/button';
import { MatDialog } from '@angular/material/dialog';
import { MatIcon } from '@angular/material/icon';
import type { ProductView, StateView } from '@shared/contracts/products';
import { firstValueFrom } from 'rxjs';
import { ProductInView } from '../product-in-view';
import type { StateDialogData } from './state-dialog';

/** The operating states a product is measured in; a required one that a build lacks is said to be unmeasured. */
@Component({
  selector: 'app-state-sheet',
  imports: [MatButton, MatIcon, MatIconButton],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './state-sheet.html',
  styleUrl: './sheet.scss',
})
export class StateSheet {
  private readonly dialog = inject(MatDialog);
  protected readonly view = inject(ProductInView);

  readonly product = input.required<ProductView>();

  protected async edit(state?: StateView): Promise<void> {
    const { StateDialog } = await import('./state-dialog');
    const data: StateDialogData = {
      url: `${this.view.api()}/states`,
      team: this.view.owner(),
      ...(state && { state }),
    };
    const dialog = this.dialog.open<unknown, StateDialogData, StateView>(StateDialog, { data, width: '560px' });
    if (await firstValueFrom(dialog.afterClosed())) this.view.reload();
  }
}
