import { Routes } from '@angular/router';
import { administratorsOnly, membersOnly, signedInOnly } from './session/session-guards';
import { sessionRoutes } from './session/session-routes';
import { toLastTeam } from './session/to-last-team';

/** Every feature is one lazy folder; the shell frames all pages that need a sign-in and answers every unknown address. */
export const routes: Routes = [
  ...sessionRoutes,
  {
    path: 'mailbox',
    title: 'Mailbox',
    loadComponent: () => import('./shell/open-frame').then((m) => m.OpenFrame),
    loadChildren: () => import('./mailbox/mailbox-routes').then((m) => m.mailboxRoutes),
  },
  {
    path: 'unsubscribe/:secret',
    title: 'Weekly digest',
    loadComponent: () => import('./digests/unsubscribe-page').then((m) => m.UnsubscribePage),
  },
  {
    path: '',
    loadComponent: () => import('./shell/shell').then((m) => m.Shell),
    canActivate: [signedInOnly],
    children: [
      {
        path: '',
        pathMatch: 'full',
        canActivate: [toLastTeam],
        loadComponent: () => import('./shell/home-page').then((m) => m.HomePage),
      },
      {
        path: 't/:team',
        canActivate: [membersOnly],
        children: [
          { path: '', pathMatch: 'full', redirectTo: 'overview' },
          { path: 'overview', loadChildren: () => import('./overview/overview-routes').then((m) => m.overviewRoutes) },
          { path: 'products', loadChildren: () => import('./products/products-routes').then((m) => m.productsRoutes) },
          { path: 'drops', loadChildren: () => import('./drops/drops-routes').then((m) => m.dropsRoutes) },
          { path: 'sweeps', loadChildren: () => import('./sweeps/sweeps-routes').then((m) => m.sweepsRoutes) },
          {
            path: 'import',
            loadChildren: () => import('./importing/importing-routes').then((m) => m.importingRoutes),
          },
          { path: 'benches', loadChildren: () => import('./benches/benches-routes').then((m) => m.benchesRoutes) },
          { path: 'limits', loadChildren: () => import('./limits/limits-routes').then((m) => m.limitsRoutes) },
          { path: 'digest', loadChildren: () => import('./digests/digests-routes').then((m) => m.digestsRoutes) },
          // members, tokens, audit and jobs
          { path: '', loadChildren: () => import('./team/team-routes').then((m) => m.teamRoutes) },
        ],
      },
      {
        path: 'installation',
        canActivate: [administratorsOnly],
        loadChildren: () => import('./installation/installation-routes').then((m) => m.installationRoutes),
      },
      {
        path: 'account',
        title: 'Your account',
        loadComponent: () => import('./session/account-page').then((m) => m.AccountPage),
      },
      {
        path: '**',
        title: 'Page not found',
        loadComponent: () => import('./shell/page-not-found').then((m) => m.PageNotFound),
      },
    ],
  },
];
