import { ChangeDetectionStrategy, Component, computed, input, output, signal } from '@angular/core';
import { MatButtonModule } from '@angular/material/button';
import { MatSortModule, type Sort } from '@angular/material/sort';

import type { CandidatesAnswer } from '../../../../shared/contracts/candidates';
import type { Receiver } from '../../../../shared/radio/receiver';
import type { Period } from '../../../../shared/radio/site';
import { NARROW } from '../../charts/frame';
import { observeWidth } from '../../charts/observe-width';
import { kilohertz, tenths } from '../../charts/readings';
import { candidateColumns, sortedCandidates } from './candidate-columns';

const FIRST = 8;

/** Candidates for the IF in the order of the ranking, every term apart; each can be put on trial. */
@Component({
  selector: 'app-candidates-table',
  templateUrl: './candidates-table.html',
  styleUrl: './candidates-table.scss',
  imports: [MatButtonModule, MatSortModule],
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class CandidatesTable {
  readonly answer = input.required<CandidatesAnswer>();
  readonly receiver = input.required<Receiver>();
  readonly period = input.required<Period>();
  readonly trialHz = input.required<number>();
  readonly taken = output<number>();

  private readonly width = observeWidth();
  private readonly sort = signal<Sort>({ active: '', direction: '' });
  private readonly isWhole = signal(false);

  protected readonly isNarrow = computed(() => this.width() < NARROW);
  protected readonly columns = computed(() => candidateColumns(this.period(), this.receiver()));
  private readonly sorted = computed(() => {
    const { active, direction } = this.sort();
    return sortedCandidates(this.answer().candidates, this.columns(), active, direction);
  });
  protected readonly rows = computed(() =>
    (this.isWhole() ? this.sorted() : this.sorted().slice(0, FIRST)).map((candidate) => ({
      ifHz: candidate.ifHz,
      frequency: kilohertz(candidate.ifHz),
      deficit: tenths(candidate.deficitDb),
      isReachable: candidate.reachable.ok,
      isOnTrial: candidate.ifHz === this.trialHz(),
      isPresent: candidate.ifHz === this.answer().present.ifHz,
      cells: this.columns().map(({ key, label, text }) => ({ key, label, text: text(candidate) })),
    })),
  );
  protected readonly rest = computed(() => this.sorted().length - this.rows().length);

  protected order(sort: Sort): void {
    this.sort.set(sort);
  }

  protected showAll(): void {
    this.isWhole.set(true);
  }
}
