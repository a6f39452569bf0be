import type { Problem, ProblemCode } from '@shared/contracts/problem';

/** Where in a file or form something is wrong, and what to do about it. */
export type ProblemPlace = Pick<Problem, 'line' | 'column' | 'found' | 'expected' | 'advice' | 'needs' | 'errors'>;

/** What a verb throws when the caller must hear why; the HTTP layer turns the code into a status. */
export class ServiceError extends Error {
  override readonly name = 'ServiceError';

  /** @param message one line that states the rule and the offending value */
  constructor(
    readonly code: ProblemCode,
    message: string,
    readonly place: ProblemPlace = {},
  ) {
    super(message);
  }
}
