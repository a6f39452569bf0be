import type { ErrorRequestHandler } from 'express';
import type { Logger } from '../log';
import { loggableUrl } from './loggable-url';
import { problemOf } from './problem-of';

/** Last middleware: every error leaves as `application/problem+json`. */
export function handleErrors(log: Logger): ErrorRequestHandler {
  return (error: unknown, request, response, next) => {
    if (response.headersSent) {
      next(error);
      return;
    }
    const problem = problemOf(error);
    if (problem.status >= 500)
      log.error({ err: error, method: request.method, url: loggableUrl(request.originalUrl) }, 'request failed');
    response.status(problem.status).type('application/problem+json').send(JSON.stringify(problem));
  };
}
