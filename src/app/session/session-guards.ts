import { inject } from '@angular/core';
import { ActivatedRouteSnapshot, CanActivateFn, RedirectCommand, Router } from '@angular/router';
import { map } from 'rxjs';
import { SessionStore } from './session-store';

/** Pages of the shell need a person; others are asked to sign in and come back to where they wanted to go. */
export const signedInOnly: CanActivateFn = (_route, state) => {
  const router = inject(Router);
  return inject(SessionStore)
    .load()
    .pipe(
      map(({ person }) => {
        if (person) return true;
        const queryParams = state.url === '/' ? {} : { return: state.url };
        return router.createUrlTree(['/sign-in'], { queryParams });
      }),
    );
};

export const signedOutOnly: CanActivateFn = () => {
  const router = inject(Router);
  return inject(SessionStore)
    .load()
    .pipe(map(({ person }) => (person ? router.createUrlTree(['/']) : true)));
};

/** A team the person does not belong to looks exactly like one that does not exist. */
export const membersOnly: CanActivateFn = (route: ActivatedRouteSnapshot) => {
  const router = inject(Router);
  const session = inject(SessionStore);
  const key = route.paramMap.get('team') ?? '';
  return session.load().pipe(map(() => (session.team(key) ? true : notFound(router))));
};

export const administratorsOnly: CanActivateFn = () => {
  const router = inject(Router);
  return inject(SessionStore)
    .load()
    .pipe(map(({ person }) => (person?.isAdministrator ? true : notFound(router))));
};

function notFound(router: Router): RedirectCommand {
  return new RedirectCommand(router.createUrlTree(['/not-found']), { skipLocationChange: true });
}
