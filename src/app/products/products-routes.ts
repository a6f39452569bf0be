import { Routes } from '@angular/router';

export const productsRoutes: Routes = [];
