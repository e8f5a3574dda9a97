import { ChangeDetectionStrategy, Component, effect, inject, input } from '@angular/core';
import { takeUntilDestroyed } from '@angular/core/rxjs-interop';
import { ReactiveFormsModule } from '@angular/forms';
import { MatButtonModule } from '@angular/material/button';
import { MatFormFieldModule } from '@angular/material/form-field';
import { MatInputModule } from '@angular/material/input';
import { MatSelectModule } from '@angular/material/select';
import { Router, RouterLink } from '@angular/router';

import { regionDraft } from '../../../../shared/contracts/region';
import { toProblem } from '../../core/api-problem';
import { FormProblems } from '../../ui/form-problems/form-problems';
import { ProblemTextPipe } from '../../ui/form-problems/problem-text-pipe';
import { Submission } from '../../ui/form-problems/submission';
import { ITU_REGIONS, ituWords } from '../../ui/itu-regions';
import { Loading } from '../../ui/page-state/loading';
import { ProblemNote } from '../../ui/page-state/problem-note';
import type { Unsaved } from '../../ui/unsaved-changes-guard';
import { fill, proposeRaster, regionForm } from '../region-form';
import { RegionStore } from '../region-store';
import { RasterFields } from './raster-fields';

/** A new region, or one to be changed. */
@Component({
  selector: 'app-region-edit',
  imports: [
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
  protected readonly form = regionForm();
  protected readonly submission = new Submission(this.form, regionDraft, toProblem);

  constructor() {
    effect(() => {
      const region = this.region.value();
      if (region) fill(this.form, region);
    });
    this.form.controls.ituRegion.valueChanges.pipe(takeUntilDestroyed()).subscribe(() => {
      if (this.form.controls.ituRegion.dirty) proposeRaster(this.form);
    });
  }

  hasUnsavedChanges(): boolean {
    return this.form.dirty;
  }

  protected async save(): Promise<void> {
    const saved = await this.submission.send(this.form.getRawValue(), (valid) =>
      this.store.save(valid, this.id()),
    );
    if (!saved) return;
    this.form.markAsPristine();
    await this.router.navigate(['/regions', saved.id]);
  }
}
