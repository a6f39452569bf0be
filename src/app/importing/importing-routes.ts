import { Routes } from '@angular/router';
import { keepUnsaved } from './keep-unsaved';

export const importingRoutes: Routes = [
  {
    path: '',
    pathMatch: 'full',
    title: 'Import sweeps',
    canDeactivate: [keepUnsaved],
    loadComponent: () => import('./import-page').then((m) => m.ImportPage),
  },
  {
    path: ':batch',
    title: 'Import',
    loadComponent: () => import('./batch-page').then((m) => m.BatchPage),
  },
];
