import { ChangeDetectionStrategy, Component, computed, effect, inject, input } from '@angular/core';
import { ReactiveFormsModule } from '@angular/forms';
import { MatButtonModule } from '@angular/material/button';
import { Router, RouterLink } from '@angular/router';
import type * as z from 'zod';

import { stationQuery } from '../../../../shared/contracts/station-list';
import { toProblem } from '../../core/api-problem';
import { FormDraft } from '../../core/form-draft';
import { DraftNote } from '../../ui/draft-note/draft-note';
import { FormProblems } from '../../ui/form-problems/form-problems';
import { Submission } from '../../ui/form-problems/submission';
import { Loading } from '../../ui/page-state/loading';
import { ProblemNote } from '../../ui/page-state/problem-note';
import type { Unsaved } from '../../ui/unsaved-changes-guard';
import { CorrectionStore } from '../correction-store';
import { EditionStore } from '../edition-store';
import { StationFields } from './station-fields';
import {
  changesOf,
  showStation,
  stationForm,
  stationToSave,
  stationTyped,
  typedStation,
} from './station-form';

type Valid = z.output<typeof stationToSave>;

/** A station that the list lacks, or one whose row is to be changed: apart from what was imported. */
@Component({
  selector: 'app-station-edit',
  imports: [
    DraftNote,
    FormProblems,
    Loading,
    MatButtonModule,
    ProblemNote,
    ReactiveFormsModule,
    RouterLink,
    StationFields,
  ],
  templateUrl: './station-edit.html',
  styleUrl: './station-edit.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class StationEdit implements Unsaved {
  private readonly store = inject(EditionStore);
  private readonly corrections = inject(CorrectionStore);
  private readonly router = inject(Router);

  /** Id of the edition. */
  readonly id = input.required<string>();
  /** Id of the station; a new one has none. */
  readonly stationId = input<string>();

  protected readonly edition = this.store.one(this.id);
  protected readonly station = this.store.station(this.id, this.stationId, () =>
    stationQuery.parse({}),
  );
  protected readonly isReady = computed(
    () =>
      this.edition.value() !== undefined &&
      (this.stationId() === undefined || this.station.value() !== undefined),
  );
  protected readonly problem = computed(() => this.edition.problem() ?? this.station.problem());
  protected readonly back = computed(() => {
    const station = this.stationId();
    return ['/editions', this.id(), ...(station === undefined ? [] : ['stations', station])];
  });
  protected readonly form = stationForm();
  protected readonly submission = new Submission(this.form, stationToSave, toProblem);
  protected readonly draft = new FormDraft({
    form: this.form,
    name: () => `station.${this.id()}.${this.stationId() ?? 'new'}`,
    shape: stationTyped,
    show: (typed) => {
      this.form.setValue(typed);
    },
  });

  constructor() {
    effect(() => {
      if (!this.isReady()) return;
      this.showStored();
      this.draft.restore();
    });
  }

  hasUnsavedChanges(): boolean {
    return this.form.dirty;
  }

  protected retry(): void {
    this.edition.reload();
    this.station.reload();
  }

  protected discardDraft(): void {
    this.draft.remove();
    this.showStored();
  }

  protected async save(): Promise<void> {
    const saved = await this.submission.send(typedStation(this.form), async (valid) => {
      await this.keep(valid);
      return true;
    });
    if (!saved) return;
    this.draft.remove();
    await this.router.navigate(this.back(), { queryParamsHandling: 'preserve' });
  }

  private async keep({ station, reason: note }: Valid): Promise<void> {
    const regionId = this.edition.value()?.regionId ?? 0;
    const listed = this.station.value();
    if (!listed) {
      await this.corrections.add(regionId, { kind: 'added', station, note, date: undefined });
      return;
    }
    const added = listed.corrections.find(({ kind }) => kind === 'added');
    if (added) {
      await this.corrections.change(regionId, added.id, { station, note, date: added.date });
      return;
    }
    const fields = changesOf(listed, station);
    const isChanged = Object.keys(fields).length > 0;
    const change = {
      kind: 'changed',
      stationId: listed.id,
      fields,
      note,
      date: undefined,
    } as const;
    if (isChanged) await this.corrections.add(regionId, change);
  }

  /** A new station is shown as the form begins. */
  private showStored(): void {
    const station = this.station.value();
    if (station) showStation(this.form, station);
    else this.form.reset();
  }
}
