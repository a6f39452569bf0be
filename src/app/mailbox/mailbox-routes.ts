import { Routes } from '@angular/router';

export const mailboxRoutes: Routes = [
  {
    path: '',
    loadComponent: () => import('./mailbox-page').then((m) => m.MailboxPage),
    children: [
      { path: '', pathMatch: 'full', loadComponent: () => import('./no-message').then((m) => m.NoMessage) },
      { path: ':id', loadComponent: () => import('./message-page').then((m) => m.MessagePage) },
    ],
  },
];
