import type { Action } from '@shared/access/permissions';
import type { ProblemCode } from '@shared/contracts/problem';
import * as z from 'zod';

/** Bodies by media type. */
export type Content = Readonly<Record<string, z.ZodType>>;

/** One call of the interface as the document tells it. */
export interface ApiCall {
  readonly method: 'get' | 'post' | 'put' | 'patch' | 'delete';
  /** Below /api/v1, parameters in braces; those named `id` or ending in `Id` are row numbers. */
  readonly path: string;
  readonly tag: string;
  readonly summary: string;
  readonly description?: string;
  /** What the caller must be allowed to do; absent: anybody signed in, and every token. */
  readonly action?: Action;
  readonly query?: z.ZodObject;
  readonly body?: Content;
  /** What it answers, by status. */
  readonly answers: Readonly<Record<number, { readonly description: string; readonly content?: Content }>>;
  /** What can go wrong beyond the request's form, the sign-in, the permission and a thing that is not there. */
  readonly problems?: readonly ProblemCode[];
}

export function json(schema: z.ZodType): Content {
  return { 'application/json': schema };
}

/** Bytes in a multipart form or as a whole body. */
export const Binary = z.string().meta({ format: 'binary', contentMediaType: 'application/octet-stream' });

/** Which team's product is meant. */
export const TeamQuery = z.object({
  team: z
    .string()
    .optional()
    .describe('key of the owning team; needed when several teams have a product with this key that you may see'),
});
