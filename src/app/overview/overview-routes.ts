import { Routes } from '@angular/router';

export const overviewRoutes: Routes = [];
