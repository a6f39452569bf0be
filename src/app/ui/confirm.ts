import { inject, Injectable } from '@angular/core';
import { MatDialog } from '@angular/material/dialog';
import { firstValueFrom } from 'rxjs';
import { ConfirmDialog, ConfirmQuestion } from './confirm-dialog';

/** Asks before a destructive act: `if (await confirm.ask({ ... })) ...`. */
@Injectable({ providedIn: 'root' })
export class Confirm {
  private readonly dialog = inject(MatDialog);

  async ask(question: ConfirmQuestion): Promise<boolean> {
    const dialog = this.dialog.open<ConfirmDialog, ConfirmQuestion, boolean>(ConfirmDialog, {
      data: question,
      maxWidth: 480,
    });
    return (await firstValueFrom(dialog.afterClosed())) ?? false;
  }
}
