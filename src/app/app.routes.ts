import type { Routes } from '@angular/router';

/** One lazy line a feature. What `receivers` does not know is looked for in `receiver`. */
export const routes: Routes = [
  {
    path: '',
    pathMatch: 'full',
    loadChildren: () => import('./welcome/welcome.routes').then((m) => m.welcomeRoutes),
  },
  {
    path: 'receivers',
    loadChildren: () => import('./receivers/receivers.routes').then((m) => m.receiversRoutes),
  },
  {
    path: 'receivers/:id',
    loadChildren: () => import('./receiver/receiver.routes').then((m) => m.receiverRoutes),
  },
  {
    path: 'regions',
    loadChildren: () => import('./regions/regions.routes').then((m) => m.regionsRoutes),
  },
  {
    path: 'editions/:id',
    loadChildren: () => import('./regions/regions.routes').then((m) => m.editionRoutes),
  },
  {
    path: 'sites',
    loadChildren: () => import('./sites/sites.routes').then((m) => m.sitesRoutes),
  },
  {
    path: '',
    loadChildren: () => import('./account/account.routes').then((m) => m.accountRoutes),
  },
];
