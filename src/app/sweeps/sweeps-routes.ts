import { Routes } from '@angular/router';

export const sweepsRoutes: Routes = [
  {
    path: '',
    pathMatch: 'full',
    title: 'Sweeps',
    loadComponent: () => import('./sweeps-page').then((m) => m.SweepsPage),
  },
  {
    path: ':sweep',
    title: 'Sweep',
    loadComponent: () => import('./sweep-page').then((m) => m.SweepPage),
  },
];
