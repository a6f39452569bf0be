import { provideHttpClient, withFetch, withInterceptors, withXsrfConfiguration } from '@angular/common/http';
import { ApplicationConfig, ErrorHandler, inject, provideBrowserGlobalErrorListeners } from '@angular/core';
import { MAT_FORM_FIELD_DEFAULT_OPTIONS, MatFormFieldDefaultOptions } from '@angular/material/form-field';
import {
  provideRouter,
  TitleStrategy,
  withComponentInputBinding,
  withInMemoryScrolling,
  withRouterConfig,
} from '@angular/router';
import { routes } from './routes';
import { CurrentTeam } from './session/current-team';
import { FaultReporter } from './session/fault-reporter';
import { signInAgain } from './session/sign-in-again';
import { PageTitle } from './shell/page-title';
import { provideIcons } from './ui/icons';
import { TEAM_TIME_ZONE } from './ui/team-time-zone';

const formFields: MatFormFieldDefaultOptions = {
  appearance: 'outline',
  subscriptSizing: 'dynamic',
  // Nearly every field is needed; labels of the others end in "(optional)".
  hideRequiredMarker: true,
};

export const appConfig: ApplicationConfig = {
  providers: [
    provideBrowserGlobalErrorListeners(),
    provideRouter(
      routes,
      withComponentInputBinding(),
      withRouterConfig({ paramsInheritanceStrategy: 'always' }),
      withInMemoryScrolling({ scrollPositionRestoration: 'enabled', anchorScrolling: 'enabled' }),
    ),
    provideHttpClient(
      withFetch(),
      withXsrfConfiguration({ cookieName: 'XSRF-TOKEN', headerName: 'X-XSRF-TOKEN' }),
      withInterceptors([signInAgain]),
    ),
    provideIcons(),
    { provide: TitleStrategy, useClass: PageTitle },
    { provide: ErrorHandler, useClass: FaultReporter },
    { provide: TEAM_TIME_ZONE, useFactory: () => inject(CurrentTeam).timeZone },
    { provide: MAT_FORM_FIELD_DEFAULT_OPTIONS, useValue: formFields },
  ],
};
