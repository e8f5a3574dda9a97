import type { Routes } from '@angular/router';

import { signedInGuard } from '../core/session/signed-in-guard';
import { PlansStore } from './plans/plans-store';

/** The feature's only public file: `app.routes.ts` loads it lazily. */
export const receiverRoutes: Routes = [
  {
    path: 'plans',
    canActivate: [signedInGuard],
    providers: [PlansStore],
    children: [
      {
        path: '',
        title: $localize`Plans`,
        loadComponent: () => import('./plans/plan-list/plan-list').then((m) => m.PlanList),
      },
      {
        path: 'compare',
        title: $localize`Two plans compared`,
        loadComponent: () => import('./plans/compare/compare-page').then((m) => m.ComparePage),
      },
      {
        path: ':planId',
        title: $localize`Plan`,
        loadComponent: () => import('./plans/plan-page/plan-page').then((m) => m.PlanPage),
      },
    ],
  },
  {
    path: '',
    canActivate: [signedInGuard],
    loadComponent: () => import('./receiver-page/receiver-page').then((m) => m.ReceiverPage),
    children: [
      {
        path: '',
        pathMatch: 'full',
        title: $localize`Choice of IF`,
        loadComponent: () => import('./choice-page/choice-page').then((m) => m.ChoicePage),
      },
      {
        path: 'dial',
        title: $localize`Dial`,
        loadComponent: () => import('./dial-page/dial-page').then((m) => m.DialPage),
      },
      {
        path: 'rejection',
        title: $localize`Rejection`,
        loadComponent: () => import('./rejection-page/rejection-page').then((m) => m.RejectionPage),
      },
      {
        path: 'whistle',
        title: $localize`Whistle`,
        loadComponent: () => import('./whistle-page/whistle-page').then((m) => m.WhistlePage),
      },
      {
        path: 'trial',
        title: $localize`Set-up on trial`,
        loadComponent: () =>
          import('./set-up-trial/set-up-trial-page').then((m) => m.SetUpTrialPage),
      },
    ],
  },
];
