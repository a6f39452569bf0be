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
  const code = codeOfStatus(error);
  return code
    ? problem(code, (error as Error).message)
    : problem('internal', 'the fault is on our side; nothing was stored. It has been logged');
}

function problem(code: ProblemCode, detail: string, place: ProblemPlace = {}): Problem {
  return { type: `/problems/${code}`, ...PROBLEM_STATUS[code], detail, ...place };
}

/** Statuses of express's body readers, its file sender and csrf-sync whose messages may be shown. */
const SHOWN: Record<number, ProblemCode> = {
  400: 'invalid',
  403: 'forbidden',
  413: 'tooLarge',
  415: 'invalid',
  416: 'invalid',
};

/** What is refused before a route sees it carries its status; anything else is ours. */
function codeOfStatus(error: unknown): ProblemCode | undefined {
  const isRefusal = error instanceof Error && 'status' in error && typeof error.status === 'number';
  return isRefusal ? SHOWN[error.status as number] : undefined;
}
