import type { Routes } from '@angular/router';

import { signedInGuard } from '../core/session/signed-in-guard';
import { unsavedChangesGuard } from '../ui/unsaved-changes-guard';
import { CorrectionStore } from './correction-store';
import { EditionStore } from './edition-store';
import { importMatcher } from './import/import-matcher';
import { RegionStore } from './region-store';

const regionEdit = () => import('./region-edit/region-edit').then((m) => m.RegionEdit);

/** Regions, their editions and imports, under `/regions`. */
export const regionsRoutes: Routes = [
  {
    path: '',
    providers: [CorrectionStore, RegionStore],
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

const stationEdit = () => import('./station-edit/station-edit').then((m) => m.StationEdit);

/** One edition, its stations and its differences, under `/editions/:id`. */
export const editionRoutes: Routes = [
  {
    path: '',
    providers: [EditionStore, CorrectionStore],
    canActivate: [signedInGuard],
    children: [
      {
        path: '',
        title: $localize`Edition`,
        loadComponent: () => import('./edition-page/edition-page').then((m) => m.EditionPage),
      },
      {
        path: 'change',
        title: $localize`Change an edition`,
        loadComponent: () => import('./edition-edit/edition-edit').then((m) => m.EditionEdit),
        canDeactivate: [unsavedChangesGuard],
      },
      {
        path: 'differences',
        title: $localize`What changed`,
        loadComponent: () =>
          import('./differences-page/differences-page').then((m) => m.DifferencesPage),
      },
      {
        path: 'stations/new',
        title: $localize`Add a station`,
        loadComponent: stationEdit,
        canDeactivate: [unsavedChangesGuard],
      },
      {
        path: 'stations/:stationId',
        title: $localize`Station`,
        loadComponent: () => import('./station-page/station-page').then((m) => m.StationPage),
      },
      {
        path: 'stations/:stationId/change',
        title: $localize`Change a station`,
        loadComponent: stationEdit,
        canDeactivate: [unsavedChangesGuard],
      },
    ],
  },
];
