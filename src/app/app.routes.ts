import type { Routes } from '@angular/router';

/** A feature and what its pages share, loaded when one of its addresses is opened. */
const feature = (load: () => Promise<Routes>) => async (): Promise<Routes> => {
  const [{ formFieldDefaults }, children] = await Promise.all([
    import('./ui/form-field-defaults'),
    load(),
  ]);
  return [{ path: '', providers: [formFieldDefaults], children }];
};

/** One lazy line a feature. What `receivers` does not know is looked for in `receiver`. */
export const routes: Routes = [
  {
    path: '',
    pathMatch: 'full',
    loadChildren: feature(() => import('./welcome/welcome.routes').then((m) => m.welcomeRoutes)),
  },
  {
    path: 'receivers',
    loadChildren: feature(() =>
      import('./receivers/receivers.routes').then((m) => m.receiversRoutes),
    ),
  },
  {
    path: 'receivers/:id',
    loadChildren: feature(() => import('./receiver/receiver.routes').then((m) => m.receiverRoutes)),
  },
  {
    path: 'shared/:token',
    loadChildren: feature(() =>
      import('./receiver/plans/shared-plan/shared-plan.routes').then((m) => m.sharedPlanRoutes),
    ),
  },
  {
    path: 'regions',
    loadChildren: feature(() => import('./regions/regions.routes').then((m) => m.regionsRoutes)),
  },
  {
    path: 'editions/:id',
    loadChildren: feature(() => import('./regions/regions.routes').then((m) => m.editionRoutes)),
  },
  {
    path: 'sites',
    loadChildren: feature(() => import('./sites/sites.routes').then((m) => m.sitesRoutes)),
  },
  {
    path: '',
    loadChildren: feature(() => import('./account/account.routes').then((m) => m.accountRoutes)),
  },
  {
    path: '**',
    title: $localize`Not found`,
    loadComponent: () => import('./shell/not-found/not-found').then((m) => m.NotFound),
  },
];
