import { eq } from 'drizzle-orm';
import request from 'supertest';
import { createApp } from '../../server/app';
import { people } from '../../server/db/schema';
import { DEMO_DOMAIN } from '../../server/demo/demo-sign-ins';
import { refuseDemoInProduction } from '../../server/demo/refuse-demo';
import { buildPerson } from '../builders/team-builder';
import { TEST_PASSWORD_HASH, signIn } from '../support/sign-in';
import { createTestContext, type TestContext } from '../support/test-context';

const PRODUCTION = {
  NODE_ENV: 'production',
  SESSION_SECRET: 'a secret of this test alone',
  SMTP_URL: 'smtp://127.0.0.1:1',
  PUBLIC_URL: 'https://strandline.example',
  STRANDLINE_DEMO: 'auto',
  TRUST_PROXY: '1',
};

let context: TestContext;
beforeEach(() => void (context = createTestContext(PRODUCTION)));
afterEach(() => context.close());

describe('production', () => {
  it('does not start on the people of the demo, whose password is public', () => {
    refuseDemoInProduction(context);
    const { person } = buildPerson(context, { email: `ada@${DEMO_DOMAIN}`, isAdministrator: true });
    expect(() => refuseDemoInProduction(context)).toThrow(context.config.dataDir);
    context.db.update(people).set({ disabledAt: 1 }).where(eq(people.id, person.id)).run();
    expect(() => refuseDemoInProduction(context)).not.toThrow();
  });

  it('behind TLS sends cookies over TLS only, and to no script but the token', async () => {
    const app = createApp(context);
    const answer = await request(app).get('/api/csrf').set('x-forwarded-proto', 'https').expect(204);
    const cookies = answer.headers['set-cookie'] as unknown as string[];
    const named = (name: string) => cookies.find((cookie) => cookie.startsWith(`${name}=`));
    expect(named('strandline')).toMatch(/HttpOnly; Secure; SameSite=Lax/);
    expect(named('XSRF-TOKEN')).toMatch(/Secure; SameSite=Lax/);
    expect(answer.headers['strict-transport-security']).toMatch(/^max-age=/);
  });

  it('shows no demo and no mailbox', async () => {
    const app = createApp(context);
    buildPerson(context, { email: `ada@${DEMO_DOMAIN}`, passwordHash: TEST_PASSWORD_HASH });
    const { body } = await request(app).get('/api/session').expect(200);
    expect(body).toMatchObject({ demo: false, mailbox: false, demoSignIns: [] });
    await request(app).get('/api/mailbox').expect(404);
  });

  it('keeps scripts of others out of every page and answer', async () => {
    const { headers } = await request(createApp(context)).get('/api/session');
    const policy = String(headers['content-security-policy']);
    expect(policy).toContain("script-src 'self'");
    expect(policy).not.toMatch(/script-src[^;]*unsafe/);
    for (const rule of ["object-src 'none'", "frame-ancestors 'none'", "base-uri 'self'", "form-action 'self'"]) {
      expect(policy).toContain(rule);
    }
  });

  it('starts a session of its own at the sign-in, whatever session came with it', async () => {
    const app = createApp(context);
    const { person } = buildPerson(context, { passwordHash: TEST_PASSWORD_HASH });
    const visitor = await signIn(app, person.email);
    const before = visitor.cookie('strandline');
    await visitor.delete('/api/session').expect(204);
    await request(app).get('/api/v1/products').set('cookie', `strandline=${before}`).expect(401);
    expect(visitor.cookie('strandline')).not.toBe(before);
  });
});
