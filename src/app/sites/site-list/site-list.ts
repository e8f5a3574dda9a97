import { ChangeDetectionStrategy, Component, inject } from '@angular/core';
import { MatButtonModule } from '@angular/material/button';
import { RouterLink } from '@angular/router';

import { Icon } from '../../ui/icon/icon';
import { Empty } from '../../ui/page-state/empty';
import { Loading } from '../../ui/page-state/loading';
import { ProblemNote } from '../../ui/page-state/problem-note';
import { PlacePipe } from '../../ui/place/place-pipe';
import { SiteStore } from '../site-store';
import { GROUNDS, nameOf, NOISES } from '../surroundings';

/** Every site of the workshop. */
@Component({
  selector: 'app-site-list',
  imports: [Empty, Icon, Loading, MatButtonModule, PlacePipe, ProblemNote, RouterLink],
  templateUrl: './site-list.html',
  styleUrl: './site-list.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class SiteList {
  protected readonly sites = inject(SiteStore).all;

  protected readonly grounds = GROUNDS;
  protected readonly noises = NOISES;
  protected readonly nameOf = nameOf;
}
