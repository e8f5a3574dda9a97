import { ChangeDetectionStrategy, Component, inject } from '@angular/core';
import { MatButtonModule } from '@angular/material/button';
import { RouterLink } from '@angular/router';

import { Icon } from '../../ui/icon/icon';
import { Empty } from '../../ui/page-state/empty';
import { Loading } from '../../ui/page-state/loading';
import { ProblemNote } from '../../ui/page-state/problem-note';
import { isLibrarian } from '../is-librarian';
import { RasterPipe } from '../raster-pipe';
import { RegionStore } from '../region-store';

/** Every region of the workshop. */
@Component({
  selector: 'app-region-list',
  imports: [Empty, Icon, Loading, MatButtonModule, ProblemNote, RasterPipe, RouterLink],
  templateUrl: './region-list.html',
  styleUrl: './region-list.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class RegionList {
  protected readonly regions = inject(RegionStore).all;
  protected readonly isLibrarian = isLibrarian();
}
