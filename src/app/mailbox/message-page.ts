import { DOCUMENT } from '@angular/common';
import { httpResource } from '@angular/common/http';
import { ChangeDetectionStrategy, Component, computed, inject, input, linkedSignal } from '@angular/core';
import { MatButton } from '@angular/material/button';
import { MatButtonToggleModule } from '@angular/material/button-toggle';
import { MatIcon } from '@angular/material/icon';
import { DomSanitizer } from '@angular/platform-browser';
import type { MailboxMessage } from '@shared/contracts/digests';
import { problemOf } from '../ui/problem';
import { ProblemBanner } from '../ui/problem-banner';
import { Skeleton } from '../ui/skeleton';
import { TimeStamp } from '../ui/time-stamp';
import { mailDocument } from './mail-document';
import { sizeText } from './size-text';
import { textParts } from './text-parts';

type Side = 'html' | 'text' | 'headers';

/** One message, as a mail program would show it. */
@Component({
  selector: 'app-message-page',
  imports: [MatButton, MatButtonToggleModule, MatIcon, ProblemBanner, Skeleton, TimeStamp],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './message-page.html',
  styleUrl: './message-page.scss',
})
export class MessagePage {
  private readonly sanitizer = inject(DomSanitizer);
  private readonly location = inject(DOCUMENT).location;

  readonly id = input.required<string>();

  private readonly answer = httpResource<MailboxMessage>(() => `/api/mailbox/${encodeURIComponent(this.id())}`);
  protected readonly message = computed(() => (this.answer.hasValue() ? this.answer.value() : undefined));
  protected readonly problem = computed(() => {
    const error = this.answer.error();
    return error && problemOf(error);
  });
  protected readonly side = linkedSignal<Side>(() => (this.message()?.html === null ? 'text' : 'html'));
  /** NOTE: trusted because the frame it goes into is sandboxed without scripts and inherits this page's content policy. */
  protected readonly document = computed(() => {
    const html = this.message()?.html;
    return html ? this.sanitizer.bypassSecurityTrustHtml(mailDocument(html, this.location)) : null;
  });
  protected readonly parts = computed(() => textParts(this.message()?.text ?? '', this.location));
  protected readonly attachments = computed(() =>
    (this.message()?.attachments ?? []).map((attachment) => ({
      ...attachment,
      isPicture: attachment.contentType.startsWith('image/'),
      size: sizeText(attachment.byteLength),
    })),
  );

  protected reload(): void {
    this.answer.reload();
  }
}
