import { DatePipe } from '@angular/common';
import { ChangeDetectionStrategy, Component, computed, input } from '@angular/core';
import { MatButtonModule } from '@angular/material/button';
import { MatMenuModule } from '@angular/material/menu';
import { RouterLink } from '@angular/router';

import type { Edition } from '../../../../shared/contracts/region';
import { Icon } from '../../ui/icon/icon';
import { editionAddress } from '../edition-store';
import { isLibrarian } from '../is-librarian';

/** What an edition is, and what can be done with it. */
@Component({
  selector: 'app-edition-head',
  imports: [DatePipe, Icon, MatButtonModule, MatMenuModule, RouterLink],
  templateUrl: './edition-head.html',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class EditionHead {
  readonly edition = input.required<Edition>();

  protected readonly isLibrarian = isLibrarian();
  protected readonly file = computed(() => `${editionAddress(this.edition().id)}/stations.csv`);
}
