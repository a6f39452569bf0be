import { HttpClient } from '@angular/common/http';
import { ChangeDetectionStrategy, Component, inject, input, signal } from '@angular/core';
import { FormControl, FormGroup, ReactiveFormsModule, Validators } from '@angular/forms';
import { MatButton } from '@angular/material/button';
import { MatFormFieldModule } from '@angular/material/form-field';
import { MatIcon } from '@angular/material/icon';
import { MatInput } from '@angular/material/input';
import { MatSnackBar } from '@angular/material/snack-bar';
import type { Problem } from '@shared/contracts/problem';
import type { ProductView } from '@shared/contracts/products';
import { Confirm } from '../../ui/confirm';
import { FieldErrorPipe } from '../../ui/field-error';
import { problemOf } from '../../ui/problem';
import { ProblemBanner } from '../../ui/problem-banner';
import { ProductInView } from '../product-in-view';

/** The teams that may read the product's results. */
@Component({
  selector: 'app-share-sheet',
  imports: [FieldErrorPipe, MatButton, MatFormFieldModule, MatIcon, MatInput, ProblemBanner, ReactiveFormsModule],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './share-sheet.html',
  styleUrl: './sheet.scss',
})
export class ShareSheet {
  private readonly http = inject(HttpClient);
  private readonly snackBar = inject(MatSnackBar);
  private readonly confirm = inject(Confirm);
  protected readonly view = inject(ProductInView);

  readonly product = input.required<ProductView>();

  protected readonly busy = signal(false);
  protected readonly problem = signal<Problem | null>(null);
  protected readonly form = new FormGroup({
    team: new FormControl('', { nonNullable: true, validators: Validators.required }),
  });

  protected share(): void {
    const key = this.form.controls.team.value.trim();
    if (key === '' || this.busy()) {
      this.form.markAllAsTouched();
      return;
    }
    this.store([...this.keys(), key], `Team ${key} may read the product now.`);
  }

  protected async unshare(team: string, teamName: string): Promise<void> {
    const isSure = await this.confirm.ask({
      title: `Stop sharing with ${teamName}?`,
      text: `${teamName} no longer sees ${this.product().name}, its builds, sweeps and drops. Nothing is deleted; you can share it again.`,
      action: 'Stop sharing',
    });
    if (!isSure) return;
    this.store(
      this.keys().filter((key) => key !== team),
      `${teamName} no longer sees the product.`,
    );
  }

  private keys(): string[] {
    return this.product().sharedWith.map(({ team }) => team);
  }

  private store(teams: string[], done: string): void {
    this.busy.set(true);
    this.problem.set(null);
    this.http.put(`${this.view.api()}/shares`, { teams }, { params: this.view.apiTeam() }).subscribe({
      next: () => {
        this.busy.set(false);
        this.form.reset();
        this.view.reload();
        this.snackBar.open(done, undefined, { duration: 5000 });
      },
      error: (error: unknown) => {
        this.problem.set(problemOf(error));
        this.busy.set(false);
      },
    });
  }
}
