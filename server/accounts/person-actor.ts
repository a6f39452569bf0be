import type { PersonActor } from '../actor';
import type { Context } from '../context';
import { findPersonById, rolesOf } from './person-store';

/** The person as an actor with the roles of this moment, or undefined when gone or disabled. */
export function personActor(context: Context, personId: number): PersonActor | undefined {
  const person = findPersonById(context.db, personId);
  if (person === undefined || person.disabledAt !== null) return undefined;
  const { id, name, email, isAdministrator } = person;
  return { kind: 'person', personId: id, name, email, isAdministrator, roles: rolesOf(context.db, id) };
}
