import { HttpClient } from '@angular/common/http';
import { inject, Injectable } from '@angular/core';
import type { BatchTags, ImportBatchView, PreviewTrace, ReadingView } from '@shared/contracts/imports';
import { decodeFrames, Frames } from '@shared/traces/frames';
import { map, Observable } from 'rxjs';
import type { Units } from './draft-file';
import type { Upload } from './plan-import';

/** The calls of the server that an import is made of. */
@Injectable({ providedIn: 'root' })
export class ImportApi {
  private readonly http = inject(HttpClient);

  /** What a file holds. Nothing is stored. */
  read(team: string, file: File, units: Units): Observable<ReadingView> {
    return this.http.post<ReadingView>(`${path(team)}/readings`, readingForm(file, units));
  }

  /** Every trace of a file in full. */
  readFrames(team: string, file: File, units: Units): Observable<Frames<PreviewTrace>> {
    return this.http
      .post(`${path(team)}/readings`, readingForm(file, units), {
        headers: { Accept: 'application/octet-stream' },
        responseType: 'arraybuffer',
      })
      .pipe(map((bytes) => decodeFrames<PreviewTrace>(bytes)));
  }

  lastTags(team: string): Observable<BatchTags | null> {
    return this.http.get<BatchTags | null>(`${path(team)}/last-tags`);
  }

  save(team: string, { files, plan }: Upload): Observable<ImportBatchView> {
    const form = new FormData();
    form.append('plan', JSON.stringify(plan));
    for (const file of files) form.append('files', file, file.name);
    return this.http.post<ImportBatchView>(`${path(team)}/imports`, form);
  }

  batch(team: string, id: number): Observable<ImportBatchView> {
    return this.http.get<ImportBatchView>(`${path(team)}/imports/${id}`);
  }
}

function path(team: string): string {
  return `/api/teams/${encodeURIComponent(team)}`;
}

function readingForm(file: File, units: Units): FormData {
  const form = new FormData();
  form.append('file', file, file.name);
  form.append('options', JSON.stringify(units));
  return form;
}
