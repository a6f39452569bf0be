import { Routes } from '@angular/router';

export const dropsRoutes: Routes = [
  {
    path: '',
    title: 'Drops',
    loadComponent: () => import('./drops-page').then((m) => m.DropsPage),
  },
  {
    path: ':id',
    title: 'Drop',
    loadComponent: () => import('./drop-page').then((m) => m.DropPage),
  },
];
