import { Routes } from '@angular/router';

export const dropsRoutes: Routes = [];
