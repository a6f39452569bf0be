import { Routes } from '@angular/router';

export const teamRoutes: Routes = [];
