import type { Problem, ProblemCode } from '@shared/contracts/problem';
import { MulterError } from 'multer';
import { ZodError } from 'zod';
import { ServiceError, type ProblemPlace } from '../service-error';
import { PROBLEM_STATUS } from './problem-status';

/** The error as problem details; what is not meant for the caller becomes `internal` without its text. */
export function problemOf(error: unknown): Problem {
  if (error instanceof ServiceError) return problem(error.code, error.message, error.place);
  if (error instanceof ZodError) {
    const errors = error.issues.map((issue) => ({ path: issue.path.join('.'), message: issue.message }));
    const first = errors[0];
    return problem(
      'invalid',
      first === undefined ? 'the request is not right' : `${first.path || 'request'}: ${first.message}`,
      { errors },
    );
  }
  if (error instanceof MulterError) {
    return error.code === 'LIMIT_FILE_SIZE'
      ? problem('tooLarge', 'the file is larger than this installation reads')
      : problem('invalid', `upload: ${error.message}${error.field ? ` (${error.field})` : ''}`);
  }
  const code = bodyParserCode(error);
  return code
    ? problem(code, (error as Error).message)
    : problem('internal', 'the fault is on our side; nothing was stored. It has been logged');
}

function problem(code: ProblemCode, detail: string, place: ProblemPlace = {}): Problem {
  return { type: `/problems/${code}`, ...PROBLEM_STATUS[code], detail, ...place };
}

/** Errors of express's body readers and csrf-sync carry their status; anything else is ours. */
function bodyParserCode(error: unknown): ProblemCode | undefined {
  if (!(error instanceof Error) || !('status' in error)) return undefined;
  if (error.status === 400) return 'invalid';
  if (error.status === 403) return 'forbidden';
  if (error.status === 413) return 'tooLarge';
  return undefined;
}
