import type { Context } from '../context';
import { insertPerson, type Person } from './person-store';

export interface NewPerson {
  /** In lower case. */
  email: string;
  name: string;
  passwordHash: string;
  isAdministrator?: boolean;
}

/** Gives somebody an account; who may be given one, and the audit entry, are the caller's. */
export function createPerson(context: Context, person: NewPerson): Person {
  return insertPerson(context.db, { ...person, createdAt: context.now() });
}
