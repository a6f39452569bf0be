import { inject, Injectable } from '@angular/core';
import { MatDialog } from '@angular/material/dialog';
import type { BuildView } from '@shared/contracts/builds';
import { firstValueFrom } from 'rxjs';
import type { BuildDialogData } from './build-form/build-dialog';
import type { ReferenceDialogData } from './builds/reference-dialog';
import { ProductInView } from './product-in-view';

/** Opens the dialogs that tabs and the build page share, each loaded when it is first needed. */
@Injectable()
export class ProductDialogs {
  private readonly dialog = inject(MatDialog);
  private readonly view = inject(ProductInView);

  /** The build as saved; undefined when the person thought better of it. */
  async editBuild(build?: BuildView): Promise<BuildView | undefined> {
    const { BuildDialog } = await import('./build-form/build-dialog');
    const data: BuildDialogData = {
      url: `${this.view.api()}/builds`,
      team: this.view.owner(),
      ...(build && { build }),
    };
    const dialog = this.dialog.open<unknown, BuildDialogData, BuildView>(BuildDialog, { data, width: '640px' });
    return firstValueFrom(dialog.afterClosed());
  }

  async chooseReference(build: ReferenceDialogData['build']): Promise<boolean> {
    const { ReferenceDialog } = await import('./builds/reference-dialog');
    const data: ReferenceDialogData = { url: `${this.view.api()}/reference`, team: this.view.owner(), build };
    const dialog = this.dialog.open<unknown, ReferenceDialogData, true>(ReferenceDialog, { data, width: '520px' });
    return (await firstValueFrom(dialog.afterClosed())) ?? false;
  }
}
