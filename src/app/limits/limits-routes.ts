import { Routes } from '@angular/router';

export const limitsRoutes: Routes = [
  {
    path: '',
    pathMatch: 'full',
    title: 'Limits',
    loadComponent: () => import('./limits-page').then((m) => m.LimitsPage),
  },
];
