import { InjectionToken, Signal, signal } from '@angular/core';

/** IANA zone of the team on screen; times of the whole client are written in it. */
export const TEAM_TIME_ZONE = new InjectionToken<Signal<string>>('TEAM_TIME_ZONE', {
  providedIn: 'root',
  factory: () => signal('UTC'),
});
