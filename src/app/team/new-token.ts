import { CdkCopyToClipboard } from '@angular/cdk/clipboard';
import { DOCUMENT } from '@angular/common';
import { httpResource } from '@angular/common/http';
import { ChangeDetectionStrategy, Component, computed, inject, input, linkedSignal, output } from '@angular/core';
import { MatButton } from '@angular/material/button';
import { MatIcon } from '@angular/material/icon';
import type { SweepPage } from '@shared/contracts/sweeps';
import type { TokenCreated } from '@shared/contracts/teams';
import { curlLine } from './curl-line';

/** A token right after it was made: the only time its secret is shown, with a call that uses it. */
@Component({
  selector: 'app-new-token',
  imports: [CdkCopyToClipboard, MatButton, MatIcon],
  changeDetection: ChangeDetectionStrategy.OnPush,
  host: { role: 'status' },
  template: `
    <h2>The token "{{ token().name }}" is made. Copy it now: it is shown this once.</h2>
    <div class="line">
      <code>{{ token().token }}</code>
      <button
        mat-flat-button
        type="button"
        [cdkCopyToClipboard]="token().token"
        (cdkCopyToClipboardCopied)="noteCopied('token', $event)"
      >
        <mat-icon svgIcon="copy" />{{ copied() === 'token' ? 'Copied' : 'Copy the token' }}
      </button>
    </div>
    <p>Try it from a shell:</p>
    <div class="line">
      <pre>{{ line() }}</pre>
      <button
        mat-stroked-button
        type="button"
        [cdkCopyToClipboard]="line()"
        (cdkCopyToClipboardCopied)="noteCopied('line', $event)"
      >
        <mat-icon svgIcon="copy" />{{ copied() === 'line' ? 'Copied' : 'Copy the line' }}
      </button>
    </div>
    <div>
      <button mat-button type="button" (click)="closed.emit()">I have it, hide the token</button>
    </div>
  `,
  styles: `
    :host {
      display: grid;
      grid-template-columns: minmax(0, 1fr);
      gap: 10px;
      padding: 16px;
      border: 1px solid var(--sl-accent);
      border-radius: 8px;
      background: var(--sl-accent-ground);
      color: var(--sl-accent-ground-ink);
    }
    .line {
      display: flex;
      flex-wrap: wrap;
      gap: 8px;
      align-items: flex-start;
    }
    code,
    pre {
      flex: 1 1 340px;
      min-width: 0;
      margin: 0;
      padding: 8px 12px;
      border-radius: 4px;
      background: var(--sl-surface);
      color: var(--sl-ink);
      font-family: 'Noto Sans Mono', monospace;
      font-size: 13px;
      line-height: 20px;
    }
    code,
    pre {
      overflow-wrap: anywhere;
      white-space: pre-wrap;
    }
  `,
})
export class NewToken {
  private readonly origin = inject(DOCUMENT).location.origin;

  readonly token = input.required<TokenCreated>();
  readonly team = input.required<string>();
  readonly closed = output();

  /** The latest sweep of the team lends the example its names. */
  private readonly latest = httpResource<SweepPage>(() => ({
    url: '/api/v1/sweeps',
    params: { team: this.team(), kind: 'product', limit: 1 },
  }));
  protected readonly copied = linkedSignal<TokenCreated, 'token' | 'line' | null>({
    source: this.token,
    computation: () => null,
  });
  protected readonly line = computed(() => {
    const sweep = this.latest.hasValue() ? this.latest.value().sweeps[0] : undefined;
    const {
      product = 'my-product',
      hardware = 'A1',
      firmware = '1.0.0',
      state = '230 V full load',
      bench = 'bench-1',
    } = sweep ?? {};
    const { token, scopes } = this.token();
    return curlLine(scopes, { origin: this.origin, token, product, hardware, firmware, state, bench });
  });

  protected noteCopied(what: 'token' | 'line', isCopied: boolean): void {
    this.copied.set(isCopied ? what : null);
  }
}
