import type { ProblemCode } from '@shared/contracts/problem';

/** HTTP status and title of every problem code; the only place that knows statuses. */
export const PROBLEM_STATUS: Record<ProblemCode, { status: number; title: string }> = {
  invalid: { status: 400, title: 'The request is not right' },
  unreadable: { status: 422, title: 'The file cannot be read as a sweep' },
  contradiction: { status: 422, title: 'File and tags contradict each other' },
  signedOut: { status: 401, title: 'Not signed in' },
  forbidden: { status: 403, title: 'Not allowed' },
  notFound: { status: 404, title: 'Not found' },
  conflict: { status: 409, title: 'Not possible now' },
  tooLarge: { status: 413, title: 'Too large' },
  throttled: { status: 429, title: 'Too many attempts' },
  internal: { status: 500, title: 'Something went wrong here' },
};
