import type { Routes } from '@angular/router';

/** The feature's only public file: `app.routes.ts` loads it lazily. */
export const accountRoutes: Routes = [
  {
    path: 'sign-in',
    title: $localize`Sign in`,
    loadComponent: () => import('./sign-in/sign-in').then((m) => m.SignIn),
  },
  {
    path: 'register',
    title: $localize`Register`,
    loadComponent: () => import('./register/register').then((m) => m.Register),
  },
];
