import { HttpErrorResponse } from '@angular/common/http';
import type { Problem } from '@shared/contracts/problem';
import { problemOf } from '../../ui/problem';

/** Problem details of a failed binary request, whose body arrives as bytes whatever it says. */
export function problemOfFrames(error: unknown): Problem {
  if (!(error instanceof HttpErrorResponse) || !(error.error instanceof ArrayBuffer)) return problemOf(error);
  const { status, statusText, headers, url } = error;
  return problemOf(new HttpErrorResponse({ error: jsonOf(error.error), status, statusText, headers, url: url ?? '' }));
}

function jsonOf(bytes: ArrayBuffer): unknown {
  try {
    return JSON.parse(new TextDecoder().decode(bytes));
  } catch {
    return null;
  }
}
