import {
  ChangeDetectionStrategy,
  Component,
  computed,
  effect,
  ElementRef,
  inject,
  input,
  linkedSignal,
  signal,
} from '@angular/core';
import { toSignal } from '@angular/core/rxjs-interop';
import { Router } from '@angular/router';
import type { Problem } from '@shared/contracts/problem';
import { map } from 'rxjs';
import { CurrentTeam } from '../session/current-team';
import { EmptyState } from '../ui/empty-state';
import { PageHeader } from '../ui/page-header';
import { problemOf } from '../ui/problem';
import { ProblemBanner } from '../ui/problem-banner';
import { FileCard } from './file-card';
import { FileDrop } from './file-drop';
import { ImportApi } from './import-api';
import { ImportDraft } from './import-draft';
import type { HoldsUnsaved } from './keep-unsaved';
import { plannedTraces, type PlannedTrace, uploadOf } from './plan-import';
import { explainPlanProblem } from './plan-problem';
import { RecentBatches } from './recent-batches';
import { SaveBar } from './save-bar';
import { TagCatalogue } from './tag-catalogue';
import { tagsForm } from './tags-form';
import { tagsOfForm } from './tags-of-form';
import { TagsPanel } from './tags-panel';

/** Sweeps in, by page: files, tags once for all, a look at the spectrum, save. */
@Component({
  selector: 'app-import-page',
  imports: [EmptyState, FileCard, FileDrop, PageHeader, ProblemBanner, RecentBatches, SaveBar, TagsPanel],
  providers: [ImportDraft, TagCatalogue],
  changeDetection: ChangeDetectionStrategy.OnPush,
  host: { '(window:beforeunload)': 'holdBack($event)' },
  templateUrl: './import-page.html',
  styleUrl: './import-page.scss',
})
export class ImportPage implements HoldsUnsaved {
  private readonly api = inject(ImportApi);
  private readonly router = inject(Router);
  private readonly element = inject<ElementRef<HTMLElement>>(ElementRef);
  protected readonly current = inject(CurrentTeam);
  protected readonly catalogue = inject(TagCatalogue);
  protected readonly draft = inject(ImportDraft);

  /** Key of the team, from the address. */
  readonly team = input.required<string>();
  /** What a link from a product or a build fills in, from the address. */
  readonly product = input<string>();
  readonly hardware = input<string>();
  readonly firmware = input<string>();

  protected readonly form = tagsForm();
  protected readonly content = toSignal(this.form.valueChanges.pipe(map(() => this.form.getRawValue())), {
    initialValue: this.form.getRawValue(),
  });
  protected readonly common = computed(() => tagsOfForm(this.content(), this.current.timeZone()));
  protected readonly planned = computed(() => plannedTraces(this.draft.files(), this.common()));
  protected readonly cards = computed(() => {
    const planned = this.planned();
    return this.draft.files().map((file, place, files) => ({
      file,
      planned: planned.filter(({ fileId }) => fileId === file.id),
      twin: files.slice(0, place).find((other) => other.reading && other.reading.sha256 === file.reading?.sha256)?.file
        .name,
    }));
  });
  protected readonly limitSetKey = computed(() => this.catalogue.chosen()?.limitSetKey);

  private readonly firstId = computed(() => this.draft.files().at(0)?.id);
  /** The unfolded file: the first at the start, then the one chosen. */
  protected readonly openId = linkedSignal<number | undefined, number | null>({
    source: this.firstId,
    computation: (first, before) => before?.value ?? first ?? null,
  });
  protected readonly isSaving = signal(false);
  protected readonly problem = signal<Problem | null>(null);
  private isSaved = false;

  constructor() {
    effect(() => this.catalogue.look(this.team(), this.content().product));
    effect(() => this.chooseOnlyOnes());
    effect(() => this.fillFromAddress());
  }

  private fillFromAddress(): void {
    const [product, hardware, firmware] = [this.product(), this.hardware(), this.firmware()];
    this.form.patchValue({ ...(product && { product }), ...(hardware && { hardware }), ...(firmware && { firmware }) });
  }

  unsaved(): string | null {
    const count = this.draft.files().length;
    if (this.isSaved || count === 0) return null;
    const files = count === 1 ? 'One file and its tags are' : `${count} files and their tags are`;
    return `${files} not saved yet. They are lost when you leave.`;
  }

  protected holdBack(event: BeforeUnloadEvent): void {
    if (this.unsaved() !== null) event.preventDefault();
  }

  protected takeFiles(files: readonly File[]): void {
    this.draft.add(this.team(), files);
  }

  protected toggle(id: number): void {
    this.openId.set(this.openId() === id ? null : id);
  }

  protected remove(id: number): void {
    this.draft.remove(id);
    if (this.openId() === id) this.openId.set(this.draft.files().at(0)?.id ?? null);
  }

  protected save(): void {
    const planned = this.planned();
    this.checkState(planned);
    const firstGap = planned.find(({ gaps }) => gaps.length > 0);
    if (this.form.invalid || firstGap) {
      this.showMissing(firstGap?.fileId);
      return;
    }
    this.isSaving.set(true);
    this.problem.set(null);
    this.api.save(this.team(), uploadOf(this.draft.files(), planned, this.common())).subscribe({
      next: ({ id }) => {
        this.isSaved = true;
        void this.router.navigate(['/t', this.team(), 'import', id]);
      },
      error: (error: unknown) => {
        this.isSaving.set(false);
        this.problem.set(explainPlanProblem(problemOf(error), planned));
      },
    });
  }

  /** A state is needed in the form only where every trace lacks one: files may name their own. */
  private checkState(planned: readonly PlannedTrace[]): void {
    const { state } = this.form.controls;
    state.updateValueAndValidity();
    const isMissing = planned.every(({ gaps }) => gaps.some(({ tag }) => tag === 'state'));
    if (isMissing) state.setErrors({ required: true });
  }

  /** Marks what is missing and leads to the first of it: a field of the form, else the file that lacks something. */
  private showMissing(fileId: number | undefined): void {
    this.form.markAllAsTouched();
    if (this.form.valid && fileId !== undefined) this.openId.set(fileId);
    const selector = this.form.invalid
      ? 'app-tags-panel .ng-invalid:is(input, mat-select)'
      : 'app-file-card .needed:is(select, input)';
    setTimeout(() => this.element.nativeElement.querySelector<HTMLElement>(selector)?.focus());
  }

  /** Where there is only one product or bench, nobody has to choose it. */
  private chooseOnlyOnes(): void {
    const { product, bench } = this.form.controls;
    const [onlyProduct, ...otherProducts] = this.catalogue.ownProducts();
    const [onlyBench, ...otherBenches] = this.catalogue.openBenches();
    if (onlyProduct && otherProducts.length === 0 && product.value === '') product.setValue(onlyProduct.key);
    if (onlyBench && otherBenches.length === 0 && bench.value === '') bench.setValue(onlyBench.key);
  }
}
