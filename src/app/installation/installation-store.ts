import { HttpClient } from '@angular/common/http';
import { inject, Injectable } from '@angular/core';
import type { Role } from '@shared/access/roles';
import type { InstallationTeam } from '@shared/contracts/teams';
import type { Observable } from 'rxjs';

/** Changes of the installation's teams and people. */
@Injectable({ providedIn: 'root' })
export class InstallationStore {
  private readonly http = inject(HttpClient);

  createTeam(team: { key: string; name: string; timeZone: string }): Observable<InstallationTeam> {
    return this.http.post<InstallationTeam>('/api/installation/teams', team);
  }

  archiveTeam(key: string, isArchived: boolean): Observable<InstallationTeam> {
    return this.http.patch<InstallationTeam>(`/api/installation/teams/${encodeURIComponent(key)}`, { isArchived });
  }

  invite(team: string, invitation: { email: string; role: Role }): Observable<unknown> {
    return this.http.post(`/api/teams/${encodeURIComponent(team)}/invitations`, invitation);
  }

  editPerson(id: number, patch: { isAdministrator?: boolean; isDisabled?: boolean }): Observable<unknown> {
    return this.http.patch(`/api/installation/people/${id}`, patch);
  }

  setRole(id: number, team: string, role: Role): Observable<unknown> {
    return this.http.put(this.membership(id, team), { role });
  }

  removeFromTeam(id: number, team: string): Observable<unknown> {
    return this.http.delete(this.membership(id, team));
  }

  private membership(id: number, team: string): string {
    return `/api/installation/people/${id}/memberships/${encodeURIComponent(team)}`;
  }
}
