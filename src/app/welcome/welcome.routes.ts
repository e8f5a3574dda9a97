import type { Routes } from '@angular/router';

import { TrialStore } from './trial-store';

/** The first page: an answer before any sign-up. */
export const welcomeRoutes: Routes = [
  {
    path: '',
    providers: [TrialStore],
    loadComponent: () => import('./welcome').then((m) => m.Welcome),
  },
];
