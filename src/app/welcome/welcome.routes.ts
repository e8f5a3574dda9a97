import type { Routes } from '@angular/router';

/** The feature's only public file: `app.routes.ts` loads it lazily. */
export const welcomeRoutes: Routes = [];
