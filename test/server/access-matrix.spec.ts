import { type Role, ROLES } from '@shared/access/roles';
import { TOKEN_SCOPES, type TokenScope } from '@shared/access/token-scopes';
import type { Test } from 'supertest';
import { type AccessScene, buildAccessScene, type Caller, CALLERS, MARK, type Method } from '../builders/access-scene';
import { countStored } from '../support/count-stored';
import { mountedRoutes } from '../support/mounted-routes';
import { createTestContext, type TestContext } from '../support/test-context';

type Ids = AccessScene['own'];

interface Rule {
  /**
   * Who may: `open` everybody; `person` whoever is signed in; `anyone` signed-in people and tokens alike; `administrator`;
   * a role: people of the team with at least this role; `scope`: no role, tokens alone.
   */
  who: 'open' | 'person' | 'anyone' | 'administrator' | Role;
  /** Scopes of team tokens that may as well. */
  scopes?: readonly TokenScope[];
  /** Administrators may, members or not. */
  administrators?: true;
  path?: (ids: Ids) => string;
  body?: (ids: Ids) => object;
  form?: (test: Test, ids: Ids) => Test;
  /** What an allowed call answers, where it is no 2xx. */
  answers?: number;
}

let serial = 0;
const READ = { who: 'viewer', scopes: ['results:read'] } as const;
const byTeam = (rest: string) => (ids: Ids) => `/api/teams/${ids.team}${rest}`;
const byProduct = (rest: string) => (ids: Ids) => `/api/v1/products/${ids.product}${rest}`;
const REVISIONS = 'hardware=C1&firmware=1.6';

/** The one table of who may call what. Every route of the application stands here; a new one fails until it does. */
const RULES: Record<string, Rule> = {
  'FILES /': { who: 'open' },
  'FILES /api/docs/swagger-ui.css': { who: 'open' },
  'FILES /api/docs/swagger-ui-bundle.js': { who: 'open' },
  'GET /{*path}': { who: 'open' },
  'GET /api/health': { who: 'open' },
  'GET /api/openapi.json': { who: 'open' },
  'GET /api/docs': { who: 'open' },
  'GET /api/docs/show-interface.js': { who: 'open' },
  'GET /api/csrf': { who: 'open' },
  'GET /api/session': { who: 'open' },
  'POST /api/session': { who: 'open', answers: 400 },
  'DELETE /api/session': { who: 'open' },
  // Throttled by e-mail, so every call names another.
  'POST /api/password-resets': { who: 'open', body: () => ({ email: `nobody-${(serial += 1)}@new.example` }) },
  'POST /api/password-resets/:token': {
    who: 'open',
    path: () => '/api/password-resets/none',
    body: () => ({ password: 'long enough to be taken' }),
    answers: 404,
  },
  'GET /api/invitations/:token': { who: 'open', path: () => '/api/invitations/none', answers: 404 },
  'POST /api/invitations/:token': { who: 'open', path: () => '/api/invitations/none', answers: 404 },
  'POST /api/digest/unsubscribe/:secret': { who: 'open', path: () => '/api/digest/unsubscribe/none' },
  'GET /api/mailbox': { who: 'open' },
  'GET /api/mailbox/:id': { who: 'open', path: () => '/api/mailbox/1' },

  'DELETE /api/session/everywhere': { who: 'person' },
  'POST /api/account/password': { who: 'person', answers: 400 },
  'GET /api/v1/limits': { who: 'anyone' },

  'GET /api/installation/teams': { who: 'administrator' },
  'POST /api/installation/teams': { who: 'administrator', answers: 400 },
  'PATCH /api/installation/teams/:team': {
    who: 'administrator',
    path: (ids) => `/api/installation/teams/${ids.team}`,
    body: () => ({ isArchived: true }),
  },
  'GET /api/installation/people': { who: 'administrator' },
  'PATCH /api/installation/people/:id': {
    who: 'administrator',
    path: (ids) => `/api/installation/people/${ids.person}`,
    body: () => ({ isDisabled: true }),
  },
  'PUT /api/installation/people/:id/memberships/:team': {
    who: 'administrator',
    path: (ids) => `/api/installation/people/${ids.person}/memberships/${ids.team}`,
    body: () => ({ role: 'engineer' }),
  },
  'DELETE /api/installation/people/:id/memberships/:team': {
    who: 'administrator',
    path: (ids) => `/api/installation/people/${ids.person}/memberships/${ids.team}`,
  },
  'GET /api/installation/audit': { who: 'administrator' },

  'GET /api/teams/:team': { ...READ, path: byTeam('') },
  'PATCH /api/teams/:team': { who: 'lead', path: byTeam(''), body: () => ({ targetMarginDb: 4 }) },
  'GET /api/teams/:team/members': { who: 'viewer', administrators: true, path: byTeam('/members') },
  'PATCH /api/teams/:team/members/:personId': {
    who: 'lead',
    administrators: true,
    path: (ids) => `/api/teams/${ids.team}/members/${ids.newcomer}`,
    body: () => ({ role: 'engineer' }),
  },
  'DELETE /api/teams/:team/members/:personId': {
    who: 'lead',
    administrators: true,
    path: (ids) => `/api/teams/${ids.team}/members/${ids.newcomer}`,
  },
  'POST /api/teams/:team/invitations': {
    who: 'lead',
    administrators: true,
    path: byTeam('/invitations'),
    body: () => ({ email: 'somebody@new.example', role: 'viewer' }),
  },
  'POST /api/teams/:team/invitations/:id/resend': {
    who: 'lead',
    administrators: true,
    path: (ids) => `/api/teams/${ids.team}/invitations/${ids.invitation}/resend`,
  },
  'DELETE /api/teams/:team/invitations/:id': {
    who: 'lead',
    administrators: true,
    path: (ids) => `/api/teams/${ids.team}/invitations/${ids.invitation}`,
  },
  'GET /api/teams/:team/tokens': { who: 'lead', path: byTeam('/tokens') },
  'POST /api/teams/:team/tokens': {
    who: 'lead',
    path: byTeam('/tokens'),
    body: () => ({ name: 'ci', scopes: ['gate:read'] }),
  },
  'DELETE /api/teams/:team/tokens/:id': { who: 'lead', path: (ids) => `/api/teams/${ids.team}/tokens/${ids.token}` },
  'GET /api/teams/:team/audit': { who: 'lead', path: byTeam('/audit') },
  'GET /api/teams/:team/benches': { ...READ, path: byTeam('/benches') },
  'POST /api/teams/:team/benches': {
    who: 'engineer',
    path: byTeam('/benches'),
    body: () => ({ key: 'new', name: 'New' }),
  },
  'PATCH /api/teams/:team/benches/:bench': {
    who: 'engineer',
    path: (ids) => `/api/teams/${ids.team}/benches/${ids.bench}`,
    body: () => ({ notes: 'moved' }),
  },
  'POST /api/teams/:team/readings': {
    who: 'technician',
    scopes: ['sweeps:write'],
    path: byTeam('/readings'),
    form: (test, ids) => test.attach('file', ids.file, 'sweep.csv'),
  },
  'POST /api/teams/:team/imports': {
    who: 'technician',
    path: byTeam('/imports'),
    form: (test, ids) =>
      test
        .field('plan', JSON.stringify({ tags: tagsOf(ids), items: [{ file: 0, tags: {} }] }))
        .attach('files', ids.file, 'sweep.csv'),
  },
  'GET /api/teams/:team/imports': { ...READ, path: byTeam('/imports') },
  'GET /api/teams/:team/imports/:id': { ...READ, path: (ids) => `/api/teams/${ids.team}/imports/${ids.batch}` },
  'GET /api/teams/:team/last-tags': { who: 'technician', path: byTeam('/last-tags') },
  'GET /api/teams/:team/jobs': { who: 'viewer', path: byTeam('/jobs') },
  'POST /api/teams/:team/judge': { who: 'lead', path: byTeam('/judge') },
  'GET /api/teams/:team/drops': { ...READ, path: byTeam('/drops') },
  'GET /api/teams/:team/digest': { who: 'viewer', path: byTeam('/digest') },
  'PATCH /api/teams/:team/digest': { who: 'lead', path: byTeam('/digest'), body: () => ({ hour: 8 }) },
  'POST /api/teams/:team/digest/recipients': {
    who: 'lead',
    path: byTeam('/digest/recipients'),
    body: () => ({ email: 'reader@new.example' }),
  },
  'DELETE /api/teams/:team/digest/recipients/:recipient': {
    who: 'lead',
    path: (ids) => `/api/teams/${ids.team}/digest/recipients/${ids.recipient}`,
  },
  'PUT /api/teams/:team/digest/mine': { who: 'viewer', path: byTeam('/digest/mine'), body: () => ({ isOn: true }) },
  'POST /api/teams/:team/digest/now': { who: 'viewer', path: byTeam('/digest/now') },

  'POST /api/v1/sweeps': {
    who: 'technician',
    scopes: ['sweeps:write'],
    form: (test, ids) => test.field('tags', JSON.stringify(tagsOf(ids))).attach('file', ids.file, 'sweep.csv'),
  },
  'GET /api/v1/sweeps': { ...READ, path: (ids) => `/api/v1/sweeps?product=${ids.product}` },
  'GET /api/v1/sweeps/:id': { ...READ, path: (ids) => `/api/v1/sweeps/${ids.sweep}` },
  'GET /api/v1/sweeps/:id/trace': { ...READ, path: (ids) => `/api/v1/sweeps/${ids.sweep}/trace` },
  'GET /api/v1/sweeps/:id/file': { ...READ, path: (ids) => `/api/v1/sweeps/${ids.sweep}/file` },
  'DELETE /api/v1/sweeps/:id': { who: 'engineer', path: (ids) => `/api/v1/sweeps/${ids.sweep}` },
  'GET /api/v1/overlay': { ...READ, path: (ids) => `/api/v1/overlay?product=${ids.product}&sweeps=${ids.sweep}` },
  'GET /api/v1/products': { ...READ, path: (ids) => `/api/v1/products?team=${ids.team}` },
  'POST /api/v1/products': {
    who: 'lead',
    path: (ids) => `/api/v1/products?team=${ids.team}`,
    body: () => ({ key: 'new', name: 'New', limitSetKey: 'CISPR32_B' }),
  },
  'GET /api/v1/products/:product': { ...READ, path: byProduct('') },
  'PATCH /api/v1/products/:product': { who: 'lead', path: byProduct(''), body: () => ({ targetMarginDb: 4 }) },
  'PUT /api/v1/products/:product/reference': {
    who: 'lead',
    path: byProduct('/reference'),
    body: (ids) => ({ buildId: ids.build, reason: 'release' }),
  },
  'PUT /api/v1/products/:product/shares': { who: 'lead', path: byProduct('/shares'), body: () => ({ teams: [] }) },
  'POST /api/v1/products/:product/states': { who: 'lead', path: byProduct('/states'), body: () => ({ name: 'idle' }) },
  'PATCH /api/v1/products/:product/states/:state': {
    who: 'lead',
    path: (ids) => `/api/v1/products/${ids.product}/states/${ids.state}`,
    body: () => ({ load: 'none' }),
  },
  'GET /api/v1/products/:product/builds': { ...READ, path: byProduct('/builds') },
  'POST /api/v1/products/:product/builds': {
    who: 'technician',
    path: byProduct('/builds'),
    body: () => ({ hardware: 'D1', firmware: '9', builtAt: '2026-03-01T00:00:00Z' }),
  },
  'GET /api/v1/products/:product/builds/:build': {
    ...READ,
    path: (ids) => `/api/v1/products/${ids.product}/builds/${ids.build}`,
  },
  'PATCH /api/v1/products/:product/builds/:build': {
    who: 'technician',
    path: (ids) => `/api/v1/products/${ids.product}/builds/${ids.build}`,
    body: () => ({ notes: 'new choke' }),
  },
  'GET /api/v1/products/:product/trend': { ...READ, path: byProduct('/trend') },
  'GET /api/v1/products/:product/margin-map': { ...READ, path: byProduct('/margin-map') },
  'GET /api/v1/products/:key/verdicts': { ...READ, path: byProduct(`/verdicts?${REVISIONS}`) },
  'POST /api/v1/products/:key/evaluate': {
    who: 'technician',
    scopes: ['sweeps:write'],
    path: byProduct('/evaluate'),
  },
  'GET /api/v1/products/:key/gate': { who: 'viewer', scopes: ['gate:read'], path: byProduct(`/gate?${REVISIONS}`) },
  'GET /api/v1/products/:key/drops': { ...READ, path: byProduct('/drops') },
  'GET /api/v1/drops/:id': { ...READ, path: (ids) => `/api/v1/drops/${ids.drop}` },
  'POST /api/v1/drops/:id/moves': {
    who: 'engineer',
    path: (ids) => `/api/v1/drops/${ids.drop}/moves`,
    body: () => ({ state: 'checking' }),
  },
  'PUT /api/v1/drops/:id/owner': {
    who: 'engineer',
    path: (ids) => `/api/v1/drops/${ids.drop}/owner`,
    body: (ids) => ({ personId: ids.person }),
  },
  'POST /api/v1/drops/:id/notes': {
    who: 'engineer',
    path: (ids) => `/api/v1/drops/${ids.drop}/notes`,
    body: () => ({ text: 'seen' }),
  },
  // Whoever asked for a run may follow it.
  'GET /api/v1/runs/:id': { who: 'viewer', scopes: TOKEN_SCOPES, path: (ids) => `/api/v1/runs/${ids.run}` },
};

function tagsOf({ product, bench }: Ids) {
  return { product, bench, hardware: 'C1', firmware: '1.8', state: 'new state', line: 'N', detector: 'QP' };
}

/** The status a caller gets; undefined: the one of an allowed call. */
function refusal({ who, scopes = [], administrators }: Rule, caller: Caller): number | undefined {
  if (who === 'open') return undefined;
  if (caller === 'nobody') return 401;
  const isToken = caller === 'foreign token' || TOKEN_SCOPES.some((scope) => scope === caller);
  if (who === 'anyone') return undefined;
  if (who === 'person') return isToken ? 403 : undefined;
  if (who === 'administrator') return caller === 'administrator' ? undefined : 403;
  if (caller === 'administrator') return administrators ? undefined : 404;
  if (caller === 'foreign lead') return 404;
  // What is for people alone may say so to a token before it looks whose it is.
  if (caller === 'foreign token') return scopes.length > 0 ? 404 : NO_TOKEN;
  if (isToken) return scopes.some((scope) => scope === caller) ? undefined : 403;
  return ROLES.indexOf(caller as Role) >= ROLES.indexOf(who) ? undefined : 403;
}

/** 403 or 404. */
const NO_TOKEN = -1;

let context: TestContext;
let scene: AccessScene;

beforeAll(async () => {
  context = createTestContext();
  scene = await buildAccessScene(context);
});
afterAll(() => context.close());

/** Calls a route as somebody and takes everything it stored back. */
async function call(route: string, { path, body, form }: Rule, caller: Caller) {
  const { $client } = context.db;
  const [method, pattern] = route.split(' ');
  $client.exec('savepoint one_call');
  try {
    const before = countStored(context);
    const test = scene.ask(caller, method.toLowerCase() as Method, path?.(scene.own) ?? pattern);
    const sent = form ? form(test, scene.own) : method === 'GET' ? test : test.send(body?.(scene.own) ?? {});
    const { status, text = '', body: bytes } = await sent;
    const seen = Buffer.isBuffer(bytes) ? bytes.toString('latin1') : text;
    return { status, seen, isUnchanged: JSON.stringify(countStored(context)) === JSON.stringify(before) };
  } finally {
    $client.exec('rollback to one_call; release one_call');
  }
}

describe('the table of who may call what', () => {
  it('holds every route of the application and no other', () => {
    expect(mountedRoutes(scene.app).sort()).toEqual(Object.keys(RULES).sort());
  });

  const called = Object.entries(RULES).filter(([route]) => !route.startsWith('FILES') && !route.includes('{*path}'));
  it.each(called)('%s', async (route, rule) => {
    const answers: Record<string, unknown> = {};
    const expected: Record<string, unknown> = {};
    for (const caller of CALLERS) {
      const { status, seen, isUnchanged } = await call(route, rule, caller);
      const refused = refusal(rule, caller);
      const isAllowed = refused === undefined;
      const isRight = isAllowed
        ? rule.answers === undefined
          ? status >= 200 && status < 300
          : status === rule.answers
        : refused === NO_TOKEN
          ? status === 403 || status === 404
          : status === refused;
      answers[caller] = isRight ? 'as the table says' : status;
      expected[caller] = 'as the table says';
      if (isAllowed) continue;
      answers[`${caller}, stored`] = !isUnchanged;
      expected[`${caller}, stored`] = false;
      answers[`${caller}, shown`] = seen.includes(MARK);
      expected[`${caller}, shown`] = false;
    }
    expect(answers).toEqual(expected);
  });
});
