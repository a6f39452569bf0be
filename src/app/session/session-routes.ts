import { Routes } from '@angular/router';
import { signedOutOnly } from './session-guards';

export const sessionRoutes: Routes = [
  {
    path: 'sign-in',
    title: 'Sign in',
    canActivate: [signedOutOnly],
    loadComponent: () => import('./sign-in-page').then((m) => m.SignInPage),
  },
  {
    path: 'forgot-password',
    title: 'Forgot password',
    loadComponent: () => import('./forgot-password-page').then((m) => m.ForgotPasswordPage),
  },
  {
    path: 'reset/:token',
    title: 'New password',
    loadComponent: () => import('./reset-password-page').then((m) => m.ResetPasswordPage),
  },
  {
    path: 'invitation/:token',
    title: 'Invitation',
    loadComponent: () => import('./invitation-page').then((m) => m.InvitationPage),
  },
];
