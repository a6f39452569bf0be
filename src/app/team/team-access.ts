import { HttpClient } from '@angular/common/http';
import { inject, Injectable } from '@angular/core';
import type { Role } from '@shared/access/roles';
import type { TeamPatch, TeamView, TokenCreated } from '@shared/contracts/teams';
import type { TokenScope } from '@shared/access/token-scopes';
import type { Observable } from 'rxjs';

/** Changes of a team: who is in it, its settings and its tokens. */
@Injectable({ providedIn: 'root' })
export class TeamAccess {
  private readonly http = inject(HttpClient);

  invite(team: string, invitation: { email: string; role: Role }): Observable<unknown> {
    return this.http.post(`${pathOf(team)}/invitations`, invitation);
  }

  resend(team: string, invitationId: number): Observable<unknown> {
    return this.http.post(`${pathOf(team)}/invitations/${invitationId}/resend`, {});
  }

  revoke(team: string, invitationId: number): Observable<unknown> {
    return this.http.delete(`${pathOf(team)}/invitations/${invitationId}`);
  }

  changeRole(team: string, personId: number, role: Role): Observable<unknown> {
    return this.http.patch(`${pathOf(team)}/members/${personId}`, { role });
  }

  remove(team: string, personId: number): Observable<unknown> {
    return this.http.delete(`${pathOf(team)}/members/${personId}`);
  }

  edit(team: string, patch: TeamPatch): Observable<TeamView> {
    return this.http.patch<TeamView>(pathOf(team), patch);
  }

  createToken(team: string, token: { name: string; scopes: TokenScope[] }): Observable<TokenCreated> {
    return this.http.post<TokenCreated>(`${pathOf(team)}/tokens`, token);
  }

  revokeToken(team: string, id: number): Observable<unknown> {
    return this.http.delete(`${pathOf(team)}/tokens/${id}`);
  }
}

export function pathOf(team: string): string {
  return `/api/teams/${encodeURIComponent(team)}`;
}
