import { Routes } from '@angular/router';

export const importingRoutes: Routes = [];
