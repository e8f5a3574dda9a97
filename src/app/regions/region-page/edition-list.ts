import { DatePipe } from '@angular/common';
import { ChangeDetectionStrategy, Component, inject, input } from '@angular/core';
import { RouterLink } from '@angular/router';

import { Empty } from '../../ui/page-state/empty';
import { Loading } from '../../ui/page-state/loading';
import { ProblemNote } from '../../ui/page-state/problem-note';
import { RegionStore } from '../region-store';

/** The editions of a region's list, the newest first, each with the way to what changed. */
@Component({
  selector: 'app-edition-list',
  imports: [DatePipe, Empty, Loading, ProblemNote, RouterLink],
  templateUrl: './edition-list.html',
  styleUrl: './edition-list.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class EditionList {
  readonly regionId = input.required<string>();

  protected readonly editions = inject(RegionStore).editions(this.regionId);
}
