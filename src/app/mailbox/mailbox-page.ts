import { httpResource } from '@angular/common/http';
import { ChangeDetectionStrategy, Component, computed, inject, linkedSignal } from '@angular/core';
import { takeUntilDestroyed, toSignal } from '@angular/core/rxjs-interop';
import { MatButton } from '@angular/material/button';
import { MatIcon } from '@angular/material/icon';
import { NavigationEnd, Router, RouterLink, RouterLinkActive, RouterOutlet } from '@angular/router';
import type { MailboxSummary } from '@shared/contracts/digests';
import { filter, interval, map } from 'rxjs';
import { EmptyState } from '../ui/empty-state';
import { PageHeader } from '../ui/page-header';
import { problemOf } from '../ui/problem';
import { ProblemBanner } from '../ui/problem-banner';
import { Skeleton } from '../ui/skeleton';
import { TimeStamp } from '../ui/time-stamp';

const POLL_MS = 5000;

/** Mail the installation would have sent, kept on this machine: the list beside the message. */
@Component({
  selector: 'app-mailbox-page',
  imports: [
    EmptyState,
    MatButton,
    MatIcon,
    PageHeader,
    ProblemBanner,
    RouterLink,
    RouterLinkActive,
    RouterOutlet,
    Skeleton,
    TimeStamp,
  ],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './mailbox-page.html',
  styleUrl: './mailbox-page.scss',
})
export class MailboxPage {
  private readonly router = inject(Router);

  private readonly answer = httpResource<MailboxSummary[]>(() => '/api/mailbox');
  protected readonly messages = linkedSignal<MailboxSummary[] | undefined, MailboxSummary[] | undefined>({
    source: () => (this.answer.hasValue() ? this.answer.value() : undefined),
    computation: (now, before) => now ?? before?.value,
  });
  protected readonly problem = computed(() => {
    const error = this.answer.error();
    return error && problemOf(error);
  });
  private readonly address = toSignal(
    this.router.events.pipe(
      filter((event) => event instanceof NavigationEnd),
      map((event) => event.urlAfterRedirects),
    ),
    { initialValue: this.router.url },
  );
  /** Whether a message is on show; on a phone the list makes room for it. */
  protected readonly isReading = computed(() => /^\/mailbox\/\d+/.test(this.address()));

  constructor() {
    interval(POLL_MS)
      .pipe(
        filter(() => !document.hidden),
        takeUntilDestroyed(),
      )
      .subscribe(() => this.answer.reload());
  }

  protected reload(): void {
    this.answer.reload();
  }
}
