import { HttpClient } from '@angular/common/http';
import { inject, Injectable } from '@angular/core';
import type { DropMove, DropView } from '@shared/contracts/drops';
import type { Observable } from 'rxjs';

/** What people may do with a drop; each answers with the drop as the server has it afterwards. */
@Injectable({ providedIn: 'root' })
export class DropTriage {
  private readonly http = inject(HttpClient);

  move(id: number, move: DropMove): Observable<DropView> {
    return this.http.post<DropView>(`/api/v1/drops/${id}/moves`, move);
  }

  assign(id: number, personId: number | null): Observable<DropView> {
    return this.http.put<DropView>(`/api/v1/drops/${id}/owner`, { personId });
  }

  note(id: number, text: string): Observable<DropView> {
    return this.http.post<DropView>(`/api/v1/drops/${id}/notes`, { text });
  }
}
