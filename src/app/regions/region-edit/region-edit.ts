import { ChangeDetectionStrategy, Component, computed, effect, inject, input } from '@angular/core';
import { takeUntilDestroyed } from '@angular/core/rxjs-interop';
import { ReactiveFormsModule } from '@angular/forms';
import { MatButtonModule } from '@angular/material/button';
import { MatFormFieldModule } from '@angular/material/form-field';
import { MatInputModule } from '@angular/material/input';
import { MatSelectModule } from '@angular/material/select';
import { Router, RouterLink } from '@angular/router';

import { regionDraft } from '../../../../shared/contracts/region';
import { toProblem } from '../../core/api-problem';
import { FormDraft } from '../../core/form-draft';
import { DraftNote } from '../../ui/draft-note/draft-note';
import { FormProblems } from '../../ui/form-problems/form-problems';
import { ProblemTextPipe } from '../../ui/form-problems/problem-text-pipe';
import { Submission } from '../../ui/form-problems/submission';
import { ITU_REGIONS, ituWords } from '../../ui/itu-regions';
import { Loading } from '../../ui/page-state/loading';
import { ProblemNote } from '../../ui/page-state/problem-note';
import type { Unsaved } from '../../ui/unsaved-changes-guard';
import { draftOf, fill, proposeRaster, regionForm, regionTyped, typedRaster } from '../region-form';
import { RegionStore } from '../region-store';
import { RasterFields } from './raster-fields';

/** A new region, or one to be changed. */
@Component({
  selector: 'app-region-edit',
  imports: [
    DraftNote,
    FormProblems,
    Loading,
    MatButtonModule,
    MatFormFieldModule,
    MatInputModule,
    MatSelectModule,
    ProblemNote,
    ProblemTextPipe,
    RasterFields,
    ReactiveFormsModule,
    RouterLink,
  ],
  templateUrl: './region-edit.html',
  styleUrl: './region-edit.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class RegionEdit implements Unsaved {
  private readonly store = inject(RegionStore);
  private readonly router = inject(Router);

  /** Id of the region in the address; a new one has none. */
  readonly id = input<string>();

  protected readonly ituRegions = ITU_REGIONS;
  protected readonly ituWords = ituWords;
  protected readonly region = this.store.one(this.id);
  protected readonly supplied = this.store.suppliedRasters();
  protected readonly form = regionForm();
  protected readonly submission = new Submission(this.form, regionDraft, toProblem);

  protected readonly isReady = computed(
    () => this.id() === undefined || this.region.value() !== undefined,
  );
  protected readonly draft = new FormDraft({
    form: this.form,
    name: () => `region.${this.id() ?? 'new'}`,
    shape: regionTyped,
    show: (typed) => {
      fill(this.form, typed);
      this.form.controls.rasters.markAsDirty();
    },
  });

  constructor() {
    effect(() => {
      if (!this.isReady()) return;
      this.showStored();
      this.draft.restore();
    });
    this.form.controls.ituRegion.valueChanges.pipe(takeUntilDestroyed()).subscribe(() => {
      if (this.form.controls.ituRegion.dirty) proposeRaster(this.form);
    });
  }

  hasUnsavedChanges(): boolean {
    return this.form.dirty;
  }

  protected discardDraft(): void {
    this.draft.remove();
    this.showStored();
  }

  protected async save(): Promise<void> {
    const saved = await this.submission.send(draftOf(this.form), (valid) =>
      this.store.save(valid, this.id()),
    );
    if (!saved) return;
    this.draft.remove();
    await this.router.navigate(['/regions', saved.id]);
  }

  /** A new region is shown as the form begins. */
  private showStored(): void {
    const region = this.region.value();
    fill(
      this.form,
      region
        ? { ...region, rasters: region.rasters.map(typedRaster) }
        : { name: '', ituRegion: null, rasters: [] },
    );
  }
}
