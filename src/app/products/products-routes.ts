import { Routes } from '@angular/router';

export const productsRoutes: Routes = [
  { path: '', pathMatch: 'full', redirectTo: '../overview' },
  {
    path: ':product/builds/:build',
    title: 'Build',
    loadComponent: () => import('./build/build-page').then((m) => m.BuildPage),
  },
  {
    path: ':product',
    title: 'Product',
    loadComponent: () => import('./product-page').then((m) => m.ProductPage),
    children: [
      { path: '', pathMatch: 'full', redirectTo: 'map' },
      { path: 'map', loadComponent: () => import('./map/map-tab').then((m) => m.MapTab) },
      { path: 'trend', loadComponent: () => import('./trend/trend-tab').then((m) => m.TrendTab) },
      { path: 'overlay', loadComponent: () => import('./overlay/overlay-tab').then((m) => m.OverlayTab) },
      { path: 'builds', loadComponent: () => import('./builds/builds-tab').then((m) => m.BuildsTab) },
      { path: 'settings', loadComponent: () => import('./settings/settings-tab').then((m) => m.SettingsTab) },
    ],
  },
];
