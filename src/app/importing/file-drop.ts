import { ChangeDetectionStrategy, Component, input, output, signal } from '@angular/core';
import { MatButton } from '@angular/material/button';
import { MatIcon } from '@angular/material/icon';

/** Where files are dropped or picked. Small once there are files, so that they have the room. */
@Component({
  selector: 'app-file-drop',
  imports: [MatButton, MatIcon],
  changeDetection: ChangeDetectionStrategy.OnPush,
  host: {
    '[class.over]': 'isOver()',
    '[class.small]': 'isSmall()',
    '(dragover)': 'allow($event)',
    '(dragleave)': 'isOver.set(false)',
    '(drop)': 'take($event)',
  },
  template: `
    <mat-icon svgIcon="tray" />
    <div class="words">
      <p class="ask">{{ isSmall() ? 'Drop more files here' : 'Drop the files of your sweeps here' }}</p>
      @if (!isSmall()) {
        <p class="muted">
          Text with columns of frequency and level: comma, semicolon or tab, decimal point or comma, Hz to GHz, dBµV or
          dBm, with or without lines before the table. Nothing is stored before you save.
        </p>
      }
    </div>
    @if (isSmall()) {
      <button mat-stroked-button type="button" (click)="field.click()">Choose files</button>
    } @else {
      <button mat-flat-button type="button" (click)="field.click()">Choose files</button>
    }
    <input
      #field
      hidden
      multiple
      type="file"
      aria-label="Files of sweeps"
      accept=".csv,.txt,.tsv,.dat,.asc,text/*"
      (change)="pick(field)"
    />
  `,
  styles: `
    :host {
      display: grid;
      gap: 12px;
      justify-items: center;
      padding: 48px 16px;
      border: 2px dashed var(--sl-outline);
      border-radius: 8px;
      background: var(--sl-surface-low);
      text-align: center;
    }
    :host(.small) {
      grid-template-columns: auto 1fr auto;
      align-items: center;
      justify-items: start;
      padding: 8px 16px;
      border-width: 1px;
      text-align: start;
    }
    :host(.over) {
      border-color: var(--sl-accent);
      background: var(--sl-accent-ground);
    }
    mat-icon {
      width: 40px;
      height: 40px;
      color: var(--sl-accent);
    }
    :host(.small) mat-icon {
      width: 24px;
      height: 24px;
    }
    .ask {
      font-size: 16px;
      font-weight: 500;
    }
    :host(.small) .ask {
      font-size: 14px;
      font-weight: 400;
    }
    .muted {
      max-width: 64ch;
      margin-top: 4px;
    }
  `,
})
export class FileDrop {
  readonly isSmall = input(false);
  readonly taken = output<readonly File[]>();

  protected readonly isOver = signal(false);

  protected allow(event: DragEvent): void {
    if (!event.dataTransfer?.types.includes('Files')) return;
    event.preventDefault();
    this.isOver.set(true);
  }

  protected take(event: DragEvent): void {
    event.preventDefault();
    this.isOver.set(false);
    this.emit(event.dataTransfer?.files);
  }

  protected pick(field: HTMLInputElement): void {
    this.emit(field.files);
    // So that the same file can be picked again after it was removed or corrected.
    field.value = '';
  }

  private emit(files: FileList | null | undefined): void {
    if (files && files.length > 0) this.taken.emit([...files]);
  }
}
