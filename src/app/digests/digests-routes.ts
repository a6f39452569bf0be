import { Routes } from '@angular/router';

export const digestsRoutes: Routes = [];
