import { READING_NEEDS } from '@shared/traces/reading-error';
import * as z from 'zod';

/** Closed list of what can go wrong; the `type` of a problem is `/problems/<code>`. */
export const PROBLEM_CODES = [
  'invalid', // the request does not have the form it must have
  'unreadable', // a file cannot be read as a sweep
  'contradiction', // file and tags say different things
  'signedOut', // nobody is signed in, or the token is not valid
  'forbidden', // the role or scope does not allow it
  'notFound', // there is none, or not for this team
  'conflict', // the state of things does not allow it
  'tooLarge',
  'throttled',
  'internal',
] as const;

export type ProblemCode = (typeof PROBLEM_CODES)[number];

/** Problem details of RFC 9457, with the place in a file or form where there is one. */
export const Problem = z
  .object({
    type: z.string().describe('/problems/<code>, stable'),
    title: z.string(),
    status: z.int(),
    detail: z.string().describe('one line that names the offending value'),
    line: z.int().optional().describe('line in the file, 1 first'),
    column: z.int().optional().describe('column in the line, 1 first'),
    found: z.string().optional(),
    expected: z.string().optional(),
    advice: z.string().optional().describe('what to do'),
    needs: z.enum(READING_NEEDS).optional().describe('what the file leaves out and must be given with it'),
    errors: z.array(z.object({ path: z.string(), message: z.string() })).optional(),
  })
  .meta({ id: 'Problem' });
export type Problem = z.infer<typeof Problem>;
