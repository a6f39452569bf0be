import { ChangeDetectionStrategy, Component, inject, signal } from '@angular/core';
import { MatButton } from '@angular/material/button';
import { MAT_DIALOG_DATA, MatDialogModule, MatDialogRef } from '@angular/material/dialog';
import { MatFormFieldModule } from '@angular/material/form-field';
import { MatInput } from '@angular/material/input';

export interface ConfirmQuestion {
  title: string;
  /** Names what goes away, and what stays. */
  text: string;
  /** The act as a verb: "Remove the token". */
  action: string;
  /** What must be typed before the act is possible; left out for acts that can be undone. */
  name?: string;
}

@Component({
  selector: 'app-confirm-dialog',
  imports: [MatButton, MatDialogModule, MatFormFieldModule, MatInput],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <h2 mat-dialog-title>{{ question.title }}</h2>
    <mat-dialog-content>
      <p>{{ question.text }}</p>
      @if (question.name) {
        <mat-form-field class="typed">
          <mat-label>Type "{{ question.name }}" to go on</mat-label>
          <input matInput autocomplete="off" #field (input)="typed.set(field.value)" />
        </mat-form-field>
      }
    </mat-dialog-content>
    <mat-dialog-actions align="end">
      <button mat-button type="button" [mat-dialog-close]="false">Keep it</button>
      <button mat-flat-button class="remove" type="button" [disabled]="!isAllowed()" (click)="dialog.close(true)">
        {{ question.action }}
      </button>
    </mat-dialog-actions>
  `,
  styles: `
    .typed {
      margin-top: 16px;
    }
    .remove:enabled {
      background: var(--sl-over-ground);
      color: var(--sl-over);
    }
  `,
})
export class ConfirmDialog {
  protected readonly question = inject<ConfirmQuestion>(MAT_DIALOG_DATA);
  protected readonly dialog = inject<MatDialogRef<ConfirmDialog, boolean>>(MatDialogRef);
  protected readonly typed = signal('');

  protected isAllowed(): boolean {
    return this.question.name === undefined || this.typed().trim() === this.question.name;
  }
}
