import { bootstrapApplication } from '@angular/platform-browser';
import { App } from './app/app';
import { appConfig } from './app/app-config';
import { config as configureZod } from 'zod/v4/core';

// zod tries whether it may compile its checks, which the content policy forbids and would report as a violation.
configureZod({ jitless: true });

bootstrapApplication(App, appConfig).catch((error: unknown) => console.error(error));
