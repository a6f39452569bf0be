import { Routes } from '@angular/router';

export const mailboxRoutes: Routes = [];
