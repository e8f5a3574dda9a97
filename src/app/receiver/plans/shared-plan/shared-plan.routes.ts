import type { Routes } from '@angular/router';

import { SharedPlanPage } from './shared-plan-page';

/** The page of a plan's link; nobody needs to be signed in. */
export const sharedPlanRoutes: Routes = [
  { path: '', pathMatch: 'full', title: $localize`Shared plan`, component: SharedPlanPage },
];
