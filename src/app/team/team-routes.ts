import { Routes } from '@angular/router';

export const teamRoutes: Routes = [
  {
    path: 'members',
    title: 'Members',
    loadComponent: () => import('./members-page').then((m) => m.MembersPage),
  },
  {
    path: 'tokens',
    title: 'Tokens',
    loadComponent: () => import('./tokens-page').then((m) => m.TokensPage),
  },
  {
    path: 'audit',
    title: 'Audit',
    loadComponent: () => import('./audit-page').then((m) => m.AuditPage),
  },
  {
    path: 'jobs',
    title: 'Job runs',
    loadComponent: () => import('./jobs-page').then((m) => m.JobsPage),
  },
];
