import { ChangeDetectionStrategy, Component } from '@angular/core';
import { MatTabsModule } from '@angular/material/tabs';
import { RouterLink, RouterLinkActive } from '@angular/router';

/** The sections of a receiver. What the address says of site, list and IF goes along. */
@Component({
  selector: 'app-section-nav',
  template: `
    <nav
      mat-tab-nav-bar
      mat-stretch-tabs="false"
      aria-label="Sections of the receiver"
      i18n-aria-label
      [tabPanel]="panel"
    >
      @for (section of sections; track section.path) {
        <a
          #link="routerLinkActive"
          mat-tab-link
          routerLinkActive
          queryParamsHandling="preserve"
          ariaCurrentWhenActive="page"
          [routerLinkActiveOptions]="matching"
          [routerLink]="section.path"
          [active]="link.isActive"
          >{{ section.name }}</a
        >
      }
    </nav>
    <mat-tab-nav-panel #panel><ng-content /></mat-tab-nav-panel>
  `,
  styles: `
    mat-tab-nav-panel {
      display: block;
      margin-top: 24px;
    }
  `,
  imports: [MatTabsModule, RouterLink, RouterLinkActive],
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class SectionNav {
  protected readonly sections = [
    { path: './', name: $localize`Choice of IF` },
    { path: 'dial', name: $localize`Dial` },
    { path: 'rejection', name: $localize`Rejection` },
    { path: 'whistle', name: $localize`Whistle` },
    { path: 'trial', name: $localize`Set-up on trial` },
  ];
  protected readonly matching = {
    paths: 'exact',
    queryParams: 'ignored',
    matrixParams: 'ignored',
    fragment: 'ignored',
  } as const;
}
