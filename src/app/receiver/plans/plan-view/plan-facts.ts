import { DatePipe } from '@angular/common';
import { ChangeDetectionStrategy, Component, computed, input } from '@angular/core';

import type { ReadablePlan } from '../../../../../shared/contracts/plan';
import { FrequencyPipe } from '../../../ui/frequency-pipe';
import { DifferenceTable } from '../../../ui/receiver-differences/difference-table';
import { differences, fieldsInWords } from '../../../ui/receiver-differences/differences';
import { stationsOf } from '../plan-words';

/** What a plan was judged from: list, site, set-up and stations, as they were then. */
@Component({
  selector: 'app-plan-facts',
  templateUrl: './plan-facts.html',
  styleUrl: './plan-facts.scss',
  imports: [DatePipe, DifferenceTable, FrequencyPipe],
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class PlanFacts {
  readonly plan = input.required<ReadablePlan>();

  protected readonly stationsOf = stationsOf;
  protected readonly setUp = computed(() => fieldsInWords(this.plan().receiver));
  /** What was on trial, where something beside the IF was. */
  protected readonly onTrial = computed(() => {
    const { receiver, savedReceiver } = this.plan();
    return savedReceiver ? differences(receiver, savedReceiver) : [];
  });
  protected readonly place = computed(() => {
    const { latitude, longitude } = this.plan().site;
    return latitude === null || longitude === null
      ? null
      : `${latitude.toFixed(1)}°, ${longitude.toFixed(1)}°`;
  });
}
