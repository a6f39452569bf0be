import { Routes } from '@angular/router';

export const sweepsRoutes: Routes = [];
