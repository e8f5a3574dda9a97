import type { Routes } from '@angular/router';

import { signedInGuard } from '../core/session/signed-in-guard';
import { unsavedChangesGuard } from '../ui/unsaved-changes-guard';
import { EditionStore } from './edition-store';
import { importMatcher } from './import/import-matcher';
import { RegionStore } from './region-store';

const regionEdit = () => import('./region-edit/region-edit').then((m) => m.RegionEdit);

/** Regions, their editions and imports, under `/regions`. */
export const regionsRoutes: Routes = [
  {
    path: '',
    providers: [RegionStore],
    canActivate: [signedInGuard],
    children: [
      {
        path: '',
        title: $localize`Regions`,
        loadComponent: () => import('./region-list/region-list').then((m) => m.RegionList),
      },
      {
        path: 'new',
        title: $localize`New region`,
        loadComponent: regionEdit,
        canDeactivate: [unsavedChangesGuard],
      },
      {
        path: ':id/edit',
        title: $localize`Change a region`,
        loadComponent: regionEdit,
        canDeactivate: [unsavedChangesGuard],
      },
      {
        matcher: importMatcher,
        title: $localize`Import a list`,
        loadComponent: () => import('./import/import-page/import-page').then((m) => m.ImportPage),
      },
      {
        path: ':id',
        title: $localize`Region`,
        loadComponent: () => import('./region-page/region-page').then((m) => m.RegionPage),
      },
    ],
  },
];

/** One edition, under `/editions/:id`. */
export const editionRoutes: Routes = [
  {
    path: '',
    title: $localize`Edition`,
    providers: [EditionStore],
    canActivate: [signedInGuard],
    loadComponent: () => import('./edition-page/edition-page').then((m) => m.EditionPage),
  },
];
