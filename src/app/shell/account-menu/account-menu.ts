import { ChangeDetectionStrategy, Component, DOCUMENT, inject } from '@angular/core';
import { MatButtonModule } from '@angular/material/button';
import { MatMenuModule } from '@angular/material/menu';
import { RouterLink } from '@angular/router';

import type { Role } from '../../../../shared/contracts/session';
import { Preferences, type Theme } from '../../core/preferences';
import { Session } from '../../core/session/session';
import { Icon } from '../../ui/icon/icon';

/** Who is signed in, where, and in which light. */
@Component({
  selector: 'app-account-menu',
  imports: [Icon, MatButtonModule, MatMenuModule, RouterLink],
  templateUrl: './account-menu.html',
  styleUrl: './account-menu.scss',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class AccountMenu {
  private readonly location = inject(DOCUMENT).location;
  protected readonly session = inject(Session);
  protected readonly preferences = inject(Preferences);

  protected readonly themes: readonly { name: Theme; label: string }[] = [
    { name: 'paper', label: $localize`Paper` },
    { name: 'walnut', label: $localize`Walnut` },
    { name: 'system', label: $localize`As the system` },
  ];

  protected readonly roles: Readonly<Record<Role, string>> = {
    member: $localize`member`,
    librarian: $localize`librarian`,
    admin: $localize`admin`,
  };

  /** Everything shown belongs to the workshop, so the page is begun anew. */
  protected async enterWorkshop(workshopId: number): Promise<void> {
    await this.session.enterWorkshop({ workshopId });
    this.location.assign('/receivers');
  }

  protected async signOut(): Promise<void> {
    await this.session.signOut();
    this.location.assign('/');
  }
}
