import { HttpErrorResponse } from '@angular/common/http';
import type { Problem, ProblemCode } from '@shared/contracts/problem';

const UNREACHED: Problem = {
  type: '/problems/unreached',
  title: 'The server did not answer',
  status: 0,
  detail: 'The server could not be reached.',
  advice: 'Check the connection and try again.',
};

const ADVICE: Partial<Record<ProblemCode, string>> = {
  signedOut: 'Sign in again; you come back to this page.',
  forbidden: 'Ask a lead of the team if you need to do this.',
  notFound: 'It may have been removed, or belongs to a team you are not in. Go back to the list.',
  throttled: 'Wait a minute, then try again.',
  internal: 'Try again. If it happens again, tell whoever runs this installation.',
};

/** Turns whatever a request failed with into problem details that a banner or form can show. */
export function problemOf(error: unknown): Problem {
  if (!(error instanceof HttpErrorResponse)) throw error;
  if (error.status === 0) return UNREACHED;
  const body: unknown = error.error;
  if (isProblem(body)) return body;
  return {
    type: '/problems/internal',
    title: 'The server gave an unexpected answer',
    status: error.status,
    detail: `The server answered with status ${error.status}.`,
  };
}

/** What to do about a problem: the server's advice, else the standing one of its kind. */
export function adviceOn(problem: Problem): string {
  const code = problem.type.replace('/problems/', '');
  return problem.advice ?? ADVICE[code as ProblemCode] ?? '';
}

function isProblem(body: unknown): body is Problem {
  return typeof body === 'object' && body !== null && 'detail' in body && 'type' in body;
}
