import { ChangeDetectionStrategy, Component, computed, inject, signal } from '@angular/core';
import { MatButton, MatIconButton } from '@angular/material/button';
import { MatIcon } from '@angular/material/icon';
import { MatMenuModule } from '@angular/material/menu';
import { MatSnackBar } from '@angular/material/snack-bar';
import { MatTooltip } from '@angular/material/tooltip';
import { Router, RouterLink } from '@angular/router';
import type { BuildSummary } from '@shared/contracts/builds';
import { EmptyState } from '../../ui/empty-state';
import { FrequencyPipe } from '../../ui/frequency';
import { MarginValue } from '../../ui/margin-value';
import { ProblemBanner } from '../../ui/problem-banner';
import { Skeleton } from '../../ui/skeleton';
import { TimeStamp } from '../../ui/time-stamp';
import { VerdictChip } from '../../ui/verdict-chip';
import { ProductDialogs } from '../product-dialogs';
import { ProductInView } from '../product-in-view';

const ROWS_AT_A_TIME = 100;

/** Every build of the product, newest first. */
@Component({
  selector: 'app-builds-tab',
  imports: [
    EmptyState,
    FrequencyPipe,
    MarginValue,
    MatButton,
    MatIcon,
    MatIconButton,
    MatMenuModule,
    MatTooltip,
    ProblemBanner,
    RouterLink,
    Skeleton,
    TimeStamp,
    VerdictChip,
  ],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './builds-tab.html',
  styleUrl: './builds-tab.scss',
})
export class BuildsTab {
  private readonly dialogs = inject(ProductDialogs);
  private readonly router = inject(Router);
  private readonly snackBar = inject(MatSnackBar);
  protected readonly view = inject(ProductInView);

  private readonly most = signal(ROWS_AT_A_TIME);
  protected readonly count = computed(() => this.view.builds()?.length ?? 0);
  protected readonly rows = computed(() => this.view.builds()?.toReversed().slice(0, this.most()));
  /** Where nothing is missing or known of any build, the column says nothing. */
  protected readonly hasCommits = computed(() => this.view.builds()?.some(({ commit }) => commit !== '') ?? false);

  protected showMore(): void {
    this.most.update((rows) => rows + ROWS_AT_A_TIME);
  }

  protected async addBuild(): Promise<void> {
    const build = await this.dialogs.editBuild();
    if (!build) return;
    this.view.reload();
    await this.router.navigate([...this.view.link(), 'builds', build.id]);
  }

  protected async chooseReference(build: BuildSummary): Promise<void> {
    if (!(await this.dialogs.chooseReference(build))) return;
    this.view.reload();
    this.snackBar.open(`Builds are judged against ${build.hardware} / ${build.firmware} now.`, undefined, {
      duration: 6000,
    });
  }
}
