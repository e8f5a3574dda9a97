import { ChangeDetectionStrategy, Component, computed, inject, input, output } from '@angular/core';
import { MatButtonToggleModule } from '@angular/material/button-toggle';
import { MatFormFieldModule } from '@angular/material/form-field';
import { MatSelectModule } from '@angular/material/select';

import { period } from '../../../../shared/contracts/quantities';
import type { Period } from '../../../../shared/radio/site';
import { EditionStore } from '../edition-store';
import { VerdictChanges } from './verdict-changes';

/** Where and when receivers are judged with both editions, and whose verdict changes. */
@Component({
  selector: 'app-verdict-section',
  imports: [MatButtonToggleModule, MatFormFieldModule, MatSelectModule, VerdictChanges],
  templateUrl: './verdict-section.html',
  styleUrl: './verdict-section.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class VerdictSection {
  readonly editionId = input.required<string>();
  readonly against = input.required<number>();
  /** As the address has them. */
  readonly site = input<string>();
  readonly period = input<string>();
  /** Another site or time is to be in the address. */
  readonly asked = output<{ site?: number; period?: Period }>();

  protected readonly sites = inject(EditionStore).sites();
  protected readonly chosenSite = computed(() =>
    this.sites.value()?.items.find(({ id }) => `${id}` === this.site()),
  );
  protected readonly chosenPeriod = computed(() => period.safeParse(this.period()).data ?? 'night');
}
