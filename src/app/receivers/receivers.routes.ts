import type { Routes } from '@angular/router';

import { signedInGuard } from '../core/session/signed-in-guard';
import { unsavedChangesGuard } from '../ui/unsaved-changes-guard';
import { ReceiverListStore } from './receiver-list/receiver-list-store';
import { SetUpStore } from './set-up/set-up-store';

const loadSetUp = () => import('./set-up/set-up').then((m) => m.SetUp);

/** The list of receivers and their set-up; one receiver's own page is the feature `receiver`. */
export const receiversRoutes: Routes = [
  {
    path: '',
    pathMatch: 'full',
    title: $localize`Receivers`,
    canActivate: [signedInGuard],
    providers: [ReceiverListStore],
    loadComponent: () => import('./receiver-list/receiver-list').then((m) => m.ReceiverList),
  },
  {
    path: 'new',
    title: $localize`New receiver`,
    canActivate: [signedInGuard],
    canDeactivate: [unsavedChangesGuard],
    providers: [SetUpStore],
    loadComponent: loadSetUp,
  },
  {
    path: ':id/set-up',
    title: $localize`Set-up`,
    canActivate: [signedInGuard],
    canDeactivate: [unsavedChangesGuard],
    providers: [SetUpStore],
    loadComponent: loadSetUp,
  },
];
