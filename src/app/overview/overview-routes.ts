import { Routes } from '@angular/router';

export const overviewRoutes: Routes = [
  {
    path: '',
    title: 'Overview',
    loadComponent: () => import('./overview-page').then((m) => m.OverviewPage),
  },
];
