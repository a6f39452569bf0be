import { Routes } from '@angular/router';

export const benchesRoutes: Routes = [
  {
    path: '',
    pathMatch: 'full',
    title: 'Benches',
    loadComponent: () => import('./benches-page').then((m) => m.BenchesPage),
  },
];
