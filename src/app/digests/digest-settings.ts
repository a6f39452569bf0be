import { HttpClient } from '@angular/common/http';
import { inject, Injectable } from '@angular/core';
import type { DigestView } from '@shared/contracts/digests';
import type { JobRunView } from '@shared/contracts/job-runs';
import type { Observable } from 'rxjs';

/** Changes of a team's digest; most answer with the digest as the server has it afterwards. */
@Injectable({ providedIn: 'root' })
export class DigestSettings {
  private readonly http = inject(HttpClient);

  edit(team: string, patch: { isOn?: boolean; weekday?: number; hour?: number }): Observable<DigestView> {
    return this.http.patch<DigestView>(digestPath(team), patch);
  }

  setMine(team: string, isOn: boolean): Observable<DigestView> {
    return this.http.put<DigestView>(`${digestPath(team)}/mine`, { isOn });
  }

  addRecipient(team: string, recipient: { email: string; name: string }): Observable<DigestView> {
    return this.http.post<DigestView>(`${digestPath(team)}/recipients`, recipient);
  }

  removeRecipient(team: string, id: number): Observable<unknown> {
    return this.http.delete(`${digestPath(team)}/recipients/${id}`);
  }

  sendMeOne(team: string): Observable<JobRunView> {
    return this.http.post<JobRunView>(`${digestPath(team)}/now`, {});
  }
}

export function digestPath(team: string): string {
  return `/api/teams/${encodeURIComponent(team)}/digest`;
}
