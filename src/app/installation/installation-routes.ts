import { Routes } from '@angular/router';

export const installationRoutes: Routes = [];
