import type { Request } from 'express';
import * as z from 'zod';
import { ServiceError } from '../service-error';

/** A text parameter of the path. */
export function pathText(request: Request, name: string): string {
  const value = request.params[name];
  if (typeof value !== 'string') throw new ServiceError('invalid', `${name}: is missing in the address`);
  return value;
}

/** A row id in the path. @throws ServiceError `notFound` when it is no positive whole number */
export function pathId(request: Request, name: string): number {
  const text = pathText(request, name);
  if (!/^[1-9]\d{0,14}$/.test(text))
    throw new ServiceError('notFound', `${name}: there is none with the number "${text}"`);
  return Number(text);
}

/** The `team` of the query, where given. */
export function queryTeam(request: Request): string | undefined {
  const team = request.query['team'];
  return typeof team === 'string' && team !== '' ? team : undefined;
}

/**
 * The query of an address. A word the schema does not know is refused: one misspelt would be taken for left out, and the
 * answer be another than asked for. `team` is everybody's.
 */
export function queryOf<Shape extends z.ZodRawShape>(
  request: Request,
  schema: z.ZodObject<Shape>,
): z.infer<z.ZodObject<Shape>> {
  const { team, ...words } = request.query;
  return z.strictObject(schema.shape).parse('team' in schema.shape ? { ...words, team } : words);
}
