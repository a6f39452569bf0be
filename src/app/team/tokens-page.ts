import { httpResource } from '@angular/common/http';
import { ChangeDetectionStrategy, Component, computed, inject, input, linkedSignal, signal } from '@angular/core';
import { MatButton } from '@angular/material/button';
import { MatSnackBar } from '@angular/material/snack-bar';
import type { Problem } from '@shared/contracts/problem';
import type { TokenCreated, TokenView } from '@shared/contracts/teams';
import { CurrentTeam } from '../session/current-team';
import { Confirm } from '../ui/confirm';
import { EmptyState } from '../ui/empty-state';
import { PageHeader } from '../ui/page-header';
import { problemOf } from '../ui/problem';
import { ProblemBanner } from '../ui/problem-banner';
import { Skeleton } from '../ui/skeleton';
import { NewToken } from './new-token';
import { pathOf, TeamAccess } from './team-access';
import { TokenForm } from './token-form';
import { TokenTable } from './token-table';

/** Tokens with which benches and pipelines speak for the team. */
@Component({
  selector: 'app-tokens-page',
  imports: [EmptyState, MatButton, NewToken, PageHeader, ProblemBanner, Skeleton, TokenForm, TokenTable],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './tokens-page.html',
  styles: `
    .sheet {
      display: grid;
      grid-template-columns: minmax(0, 1fr);
      gap: 12px;
    }
  `,
})
export class TokensPage {
  private readonly access = inject(TeamAccess);
  private readonly confirm = inject(Confirm);
  private readonly snackBar = inject(MatSnackBar);
  private readonly currentTeam = inject(CurrentTeam);

  readonly team = input.required<string>();

  protected readonly mayManage = computed(() => this.currentTeam.may('tokens.manage'));
  protected readonly tokens = httpResource<TokenView[]>(() =>
    this.mayManage() ? `${pathOf(this.team())}/tokens` : undefined,
  );
  /** The token just made: gone for good when the page is left. */
  protected readonly created = linkedSignal<string, TokenCreated | null>({
    source: this.team,
    computation: () => null,
  });
  protected readonly loadProblem = computed(() => {
    const error = this.tokens.error();
    return error && problemOf(error);
  });
  protected readonly problem = signal<Problem | null>(null);

  protected showCreated(token: TokenCreated): void {
    this.created.set(token);
    this.tokens.reload();
  }

  protected forget(): void {
    this.created.set(null);
  }

  protected async revoke({ id, name }: TokenView): Promise<void> {
    const isSure = await this.confirm.ask({
      title: `Revoke the token "${name}"?`,
      text: 'Whatever uses it is refused from now on. This cannot be undone; what it sent before stays.',
      action: 'Revoke the token',
      name,
    });
    if (!isSure) return;
    this.problem.set(null);
    this.access.revokeToken(this.team(), id).subscribe({
      next: () => {
        if (this.created()?.id === id) this.forget();
        this.tokens.reload();
        this.snackBar.open(`The token "${name}" is revoked.`, undefined, { duration: 5000 });
      },
      error: (error: unknown) => this.problem.set(problemOf(error)),
    });
  }

  protected reload(): void {
    this.tokens.reload();
  }
}
