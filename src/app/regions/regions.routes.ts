import type { Routes } from '@angular/router';

/** Regions, their editions and imports, under `/regions`. */
export const regionsRoutes: Routes = [];

/** One edition, under `/editions/:id`. */
export const editionRoutes: Routes = [];
