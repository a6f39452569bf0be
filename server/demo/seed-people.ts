import { createPerson } from '../accounts/create-person';
import { personWithEmail } from '../accounts/find-person';
import { hashPassword } from '../accounts/password-hash';
import { personActor } from '../accounts/person-actor';
import type { PersonActor } from '../actor';
import type { Context } from '../context';
import { newSecret } from '../tokens/token-secret';
import { DEMO_PASSWORD } from './demo-sign-ins';
import type { DemoScenario } from './scenario-types';
import { insertBench, insertDigestRecipient, insertDigestSetting, insertMembership, insertTeam } from './seed-store';

/** The one hash all demo people share, made before the transaction because hashing is asynchronous. */
export function demoPasswordHash(): Promise<string> {
  return hashPassword(DEMO_PASSWORD);
}

/** Stores the demo's teams, benches and people; every lead and engineer gets the digest. */
export function seedPeople(context: Context, scenario: DemoScenario, passwordHash: string): void {
  const { db } = context;
  const createdAt = context.now();
  const teamIds = new Map<string, number>();
  for (const { key, name, timeZone, targetMarginDb } of scenario.teams) {
    const team = insertTeam(db, { key, name, timeZone, targetMarginDb, createdAt });
    teamIds.set(key, team.id);
    insertDigestSetting(db, team.id);
  }
  for (const { key, name, location, lisn, receiver, notes, teamKeys } of scenario.benches) {
    for (const teamKey of teamKeys) {
      insertBench(db, { key, name, location, lisn, receiver, notes, createdAt, teamId: idOf(teamIds, teamKey) });
    }
  }
  for (const { name, email, isAdministrator, memberships } of scenario.people) {
    const person = createPerson(context, { name, email, isAdministrator, passwordHash });
    for (const { teamKey, role } of memberships) {
      const teamId = idOf(teamIds, teamKey);
      insertMembership(db, { teamId, personId: person.id, role, createdAt });
      if (role === 'lead' || role === 'engineer') {
        insertDigestRecipient(db, {
          teamId,
          personId: person.id,
          email,
          name,
          unsubscribeSecret: newSecret(),
          createdAt,
        });
      }
    }
  }
}

/** A person of the demo as an actor. @throws Error when the scenario names somebody it does not have */
export function demoActor(context: Context, email: string): PersonActor {
  const person = personWithEmail(context, email);
  const actor = person && personActor(context, person.id);
  if (actor === undefined) throw new Error(`the demo scenario has no person ${email}`);
  return actor;
}

/** The first person of the demo with this role in the team. */
export function demoActorWith(context: Context, scenario: DemoScenario, teamKey: string, role: string): PersonActor {
  const person = scenario.people.find((one) =>
    one.memberships.some((own) => own.teamKey === teamKey && own.role === role),
  );
  if (person === undefined) throw new Error(`the demo scenario has no ${role} in ${teamKey}`);
  return demoActor(context, person.email);
}

function idOf(ids: ReadonlyMap<string, number>, key: string): number {
  const id = ids.get(key);
  if (id === undefined) throw new Error(`the demo scenario names a team ${key} that it does not have`);
  return id;
}
