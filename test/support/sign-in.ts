import { hashSync } from '@node-rs/argon2';
import type { Role } from '@shared/access/roles';
import { CookieAccessInfo } from 'cookiejar';
import type { Express } from 'express';
import request, { type Test } from 'supertest';
import type { PersonActor } from '../../server/actor';
import type { Context } from '../../server/context';
import { buildPerson, TEST_PASSWORD } from '../builders/team-builder';

/** Argon2id hash of TEST_PASSWORD with the least work, for `buildPerson(context, { passwordHash: TEST_PASSWORD_HASH })`. */
export const TEST_PASSWORD_HASH = hashSync(TEST_PASSWORD, { memoryCost: 8, timeCost: 1, parallelism: 1 });

type Method = 'get' | 'post' | 'put' | 'patch' | 'delete';

/** A browser as far as the server can tell: keeps cookies and sends the cross-site token as the pages do. */
export class Visitor {
  private readonly agent: ReturnType<typeof request.agent>;

  constructor(app: Express) {
    this.agent = request.agent(app);
  }

  readonly get = (path: string): Test => this.ask('get', path);
  readonly post = (path: string): Test => this.ask('post', path);
  readonly put = (path: string): Test => this.ask('put', path);
  readonly patch = (path: string): Test => this.ask('patch', path);
  readonly delete = (path: string): Test => this.ask('delete', path);

  cookie(name: string): string | undefined {
    return this.agent.jar.getCookie(name, CookieAccessInfo.All)?.value;
  }

  private ask(method: Method, path: string): Test {
    const token = this.cookie('XSRF-TOKEN');
    const test = this.agent[method](path);
    return token === undefined ? test : test.set('x-xsrf-token', token);
  }
}

/** Somebody who has opened the pages and not signed in. */
export async function visit(app: Express): Promise<Visitor> {
  const visitor = new Visitor(app);
  await visitor.get('/api/csrf').expect(204);
  return visitor;
}

/** Signs in through the real route. */
export async function signIn(app: Express, email: string, password: string = TEST_PASSWORD): Promise<Visitor> {
  const visitor = await visit(app);
  await visitor.post('/api/session').send({ email, password }).expect(204);
  return visitor;
}

/** Builds a person with the role in the team and signs them in. */
export async function signInAs(
  context: Context,
  app: Express,
  override: Omit<Parameters<typeof buildPerson>[1] & object, 'passwordHash'> & { teamId?: number; role?: Role } = {},
): Promise<{ visitor: Visitor; actor: PersonActor }> {
  const { actor } = buildPerson(context, { ...override, passwordHash: TEST_PASSWORD_HASH });
  return { visitor: await signIn(app, actor.email), actor };
}
