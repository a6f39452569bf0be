import { inject } from '@angular/core';
import { CanActivateFn, Router } from '@angular/router';
import { CurrentTeam } from './current-team';

/** `/` leads to the overview of the team looked at last; people without a team stay and read how to get one. */
export const toLastTeam: CanActivateFn = () => {
  const team = inject(CurrentTeam).key();
  return team === undefined ? true : inject(Router).createUrlTree(['/t', team, 'overview']);
};
