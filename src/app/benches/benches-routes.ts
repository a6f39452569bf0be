import { Routes } from '@angular/router';

export const benchesRoutes: Routes = [];
