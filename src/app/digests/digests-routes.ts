import { Routes } from '@angular/router';

export const digestsRoutes: Routes = [
  {
    path: '',
    title: 'Digest',
    loadComponent: () => import('./digest-page').then((m) => m.DigestPage),
  },
];
