import { ChangeDetectionStrategy, Component, computed, input, output, signal } from '@angular/core';
import { MatButtonModule } from '@angular/material/button';
import { MatSortModule, type Sort } from '@angular/material/sort';

import type { Candidate, CandidatesAnswer } from '../../../../shared/contracts/candidates';
import type { Receiver } from '../../../../shared/radio/receiver';
import type { Period } from '../../../../shared/radio/site';
import { observeWidth } from '../../charts/observe-width';
import { kilohertz, tenths } from '../../charts/readings';
import type { CandidateSort } from '../address/choice-view';
import { candidateColumns, sortedCandidates } from './candidate-columns';
import { CandidateList, type CandidateRow } from './candidate-list';

const FIRST = 8;
/** Below this width, CSS pixels, the columns no longer stand side by side: a list takes their place. */
const COLUMNS_FROM = 1040;

/** Candidates for the IF in the order of the ranking, every term apart; each can be put on trial. */
@Component({
  selector: 'app-candidates-table',
  templateUrl: './candidates-table.html',
  styleUrl: './candidates-table.scss',
  imports: [CandidateList, MatButtonModule, MatSortModule],
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class CandidatesTable {
  readonly answer = input.required<CandidatesAnswer>();
  readonly receiver = input.required<Pick<Receiver, 'bfo'>>();
  readonly period = input.required<Period>();
  readonly trialHz = input.required<number>();
  /** Null: as ranked. */
  readonly sort = input<CandidateSort | null>(null);
  readonly sorted = output<CandidateSort | null>();
  readonly taken = output<number>();

  private readonly width = observeWidth();
  private readonly isWhole = signal(false);

  protected readonly isList = computed(() => this.width() < COLUMNS_FROM);
  protected readonly columns = computed(() => candidateColumns(this.period(), this.receiver()));
  private readonly all = computed(() =>
    sortedCandidates(this.answer().candidates, this.columns(), this.sort()),
  );
  protected readonly rows = computed(() =>
    this.all()
      .map((candidate, at) => ({ ...this.row(candidate), at }))
      // What is on trial and what is now are in sight, wherever they stand.
      .filter(({ at, isOnTrial, isPresent }) =>
        this.isWhole() ? true : at < FIRST || isOnTrial || isPresent,
      ),
  );
  protected readonly rest = computed(() => this.all().length - this.rows().length);

  protected order({ active, direction }: Sort): void {
    this.sorted.emit(direction === '' ? null : { active, direction });
  }

  /** Sorts a list, from the better end. */
  protected choose(key: string): void {
    const column = this.columns().find((each) => each.key === key);
    const direction = column?.best === 'high' ? 'desc' : 'asc';
    this.sorted.emit(key === '' ? null : { active: key, direction });
  }

  protected showAll(): void {
    this.isWhole.set(true);
  }

  private row(candidate: Candidate): CandidateRow {
    return {
      ifHz: candidate.ifHz,
      frequency: kilohertz(candidate.ifHz),
      deficit: tenths(candidate.deficitDb),
      isReachable: candidate.reachable.ok,
      isOnTrial: candidate.ifHz === this.trialHz(),
      isPresent: candidate.ifHz === this.answer().present.ifHz,
      cells: this.columns().map(({ key, label, text }) => ({ key, label, text: text(candidate) })),
    };
  }
}
