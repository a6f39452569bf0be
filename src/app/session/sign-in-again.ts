import { HttpErrorResponse, HttpInterceptorFn } from '@angular/common/http';
import { inject } from '@angular/core';
import { Router } from '@angular/router';
import { catchError, throwError } from 'rxjs';
import { SessionStore } from './session-store';

/** A session that ended while a page was open leads to the sign-in page and back again afterwards. */
export const signInAgain: HttpInterceptorFn = (request, next) => {
  const router = inject(Router);
  const session = inject(SessionStore);
  return next(request).pipe(
    catchError((error: unknown) => {
      const ended = error instanceof HttpErrorResponse && error.status === 401 && session.person() !== null;
      if (ended) {
        session.forget();
        void router.navigate(['/sign-in'], { queryParams: { return: router.url, ended: true } });
      }
      return throwError(() => error);
    }),
  );
};
