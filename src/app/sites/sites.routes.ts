import type { Routes } from '@angular/router';

import { signedInGuard } from '../core/session/signed-in-guard';
import { unsavedChangesGuard } from '../ui/unsaved-changes-guard';
import { SiteStore } from './site-store';

const sitePage = () => import('./site-page/site-page').then((m) => m.SitePage);

/** Where the workshop's aerials stand, under `/sites`. */
export const sitesRoutes: Routes = [
  {
    path: '',
    providers: [SiteStore],
    canActivate: [signedInGuard],
    children: [
      {
        path: '',
        title: $localize`Sites`,
        loadComponent: () => import('./site-list/site-list').then((m) => m.SiteList),
      },
      {
        path: 'new',
        title: $localize`New site`,
        loadComponent: sitePage,
        canDeactivate: [unsavedChangesGuard],
      },
      {
        path: ':id',
        title: $localize`Site`,
        loadComponent: sitePage,
        canDeactivate: [unsavedChangesGuard],
      },
    ],
  },
];
