import { Routes } from '@angular/router';

export const installationRoutes: Routes = [
  {
    path: '',
    loadComponent: () => import('./installation-frame').then((m) => m.InstallationFrame),
    children: [
      { path: '', pathMatch: 'full', redirectTo: 'teams' },
      { path: 'teams', title: 'Teams', loadComponent: () => import('./teams-page').then((m) => m.TeamsPage) },
      { path: 'people', title: 'People', loadComponent: () => import('./people-page').then((m) => m.PeoplePage) },
      {
        path: 'audit',
        title: 'Installation audit',
        loadComponent: () => import('./installation-audit').then((m) => m.InstallationAudit),
      },
    ],
  },
];
