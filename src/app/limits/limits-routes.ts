import { Routes } from '@angular/router';

export const limitsRoutes: Routes = [];
