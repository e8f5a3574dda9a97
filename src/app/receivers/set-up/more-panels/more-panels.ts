import { ChangeDetectionStrategy, Component, input, linkedSignal } from '@angular/core';
import { toObservable, toSignal } from '@angular/core/rxjs-interop';
import { MatExpansionModule } from '@angular/material/expansion';
import { map, startWith, switchMap } from 'rxjs';

import type { SetType } from '../../../core/set-types';
import type { FormIssue } from '../../../ui/form-problems/form-issues';
import { AerialFields } from '../aerial-fields/aerial-fields';
import { BandDetails } from '../band-details/band-details';
import { BfoFields } from '../bfo-fields/bfo-fields';
import { CircuitFields } from '../circuit-fields/circuit-fields';
import { FilterFields } from '../filter-fields/filter-fields';
import { MixerFields } from '../mixer-fields/mixer-fields';
import type { ReceiverControls } from '../receiver-form/controls';
import { SecondConversionFields } from '../second-conversion-fields/second-conversion-fields';
import { SelectivityFields } from '../selectivity-fields/selectivity-fields';
import { TrackingFields } from '../tracking-fields/tracking-fields';
import { TrapFields } from '../trap-fields/trap-fields';
import { isUntouched, type Panel, panelOf, panelsOf, summaries } from './panels';

/** What can be said about a set beyond its IF and bands; each part opens on demand. */
@Component({
  selector: 'app-more-panels',
  imports: [
    AerialFields,
    BandDetails,
    BfoFields,
    CircuitFields,
    FilterFields,
    MatExpansionModule,
    MixerFields,
    SecondConversionFields,
    SelectivityFields,
    TrackingFields,
    TrapFields,
  ],
  templateUrl: './more-panels.html',
  styleUrl: './more-panels.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class MorePanels {
  readonly form = input.required<ReceiverControls>();
  /** Type of set whose typical values were filled in. */
  readonly type = input.required<SetType | null>();
  /** What is wrong; a panel that hides some of it opens. */
  readonly issues = input.required<readonly FormIssue[]>();

  protected readonly panels: readonly { name: Panel; title: string }[] = [
    { name: 'selectivity', title: $localize`Selectivity and audio` },
    { name: 'circuits', title: $localize`Tuned circuits` },
    { name: 'bands', title: $localize`Oscillator, listening and dial of each band` },
    { name: 'tracking', title: $localize`Tracking of the oscillator` },
    { name: 'aerial', title: $localize`Aerial` },
    { name: 'mixer', title: $localize`Stray pick-up and mixer` },
    { name: 'filter', title: $localize`Fixed filter` },
    { name: 'bfo', title: $localize`BFO` },
    { name: 'trap', title: $localize`Wave trap` },
    { name: 'second', title: $localize`Second conversion` },
  ];
  protected readonly opened = linkedSignal(() => new Set(panelsOf(this.issues())));
  private readonly summaries = toSignal(
    toObservable(this.form).pipe(
      switchMap((form) =>
        form.valueChanges.pipe(
          startWith(null),
          map(() => summaries(form.getRawValue())),
        ),
      ),
    ),
  );

  /** Opens the panel that hides a field. */
  reveal(path: string): void {
    const panel = panelOf(path);
    if (panel) this.setOpen(panel, true);
  }

  protected describe(panel: Panel): string {
    const summary = this.summaries()?.[panel] ?? '';
    return this.type() !== null && isUntouched(panel, this.form())
      ? $localize`${summary}:summary: – typical`
      : summary;
  }

  protected setOpen(panel: Panel, isOpen: boolean): void {
    const panels = new Set(this.opened());
    if (isOpen) panels.add(panel);
    else panels.delete(panel);
    this.opened.set(panels);
  }
}
