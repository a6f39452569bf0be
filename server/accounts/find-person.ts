import type { Context } from '../context';
import { ServiceError } from '../service-error';
import { findPersonByEmail, findPersonById, type Person } from './person-store';

/** @throws ServiceError `notFound` */
export function findPerson(context: Context, id: number): Person {
  const person = findPersonById(context.db, id);
  if (person === undefined) throw new ServiceError('notFound', `there is no person ${id}`);
  return person;
}

/** @param email in lower case */
export function personWithEmail(context: Context, email: string): Person | undefined {
  return findPersonByEmail(context.db, email);
}
