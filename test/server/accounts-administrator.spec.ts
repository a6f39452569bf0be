import { spawnSync } from 'node:child_process';
import { mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { createApp } from '../../server/app';
import { readConfig } from '../../server/config/read-config';
import { type Context, createContext } from '../../server/context';
import { migrate } from '../../server/db/migrate';
import { TEST_PASSWORD } from '../builders/team-builder';
import { signIn, visit } from '../support/sign-in';

let dataDir: string;
let environment: NodeJS.ProcessEnv;
let context: Context;

beforeEach(() => {
  dataDir = mkdtempSync(join(tmpdir(), 'strandline-'));
  environment = { NODE_ENV: 'test', LOG_LEVEL: 'silent', STRANDLINE_DATA_DIR: dataDir, STRANDLINE_DEMO: 'off' };
  context = createContext(readConfig(environment), 'test');
});
afterEach(() => {
  context.close();
  rmSync(dataDir, { recursive: true, force: true });
});

function run(input: string, ...given: string[]) {
  return spawnSync(process.execPath, ['--import', 'tsx', 'server/accounts/create-administrator.ts', ...given], {
    env: { PATH: process.env['PATH'], ...environment },
    encoding: 'utf8',
    input,
  });
}

const ADA = ['--email', 'Ada@strandline.example', '--name', 'Ada Vane'];

describe('making the first administrator at the server', () => {
  it('takes the password from the standard input', async () => {
    migrate(context.db);
    expect(run(`${TEST_PASSWORD}\n`, ...ADA, '--password-stdin')).toMatchObject({
      status: 0,
      stdout: 'ada@strandline.example is an administrator.\n',
    });
    const visitor = await signIn(createApp(context), 'ada@strandline.example');
    const { body } = await visitor.get('/api/session');
    expect(body.person).toMatchObject({ name: 'Ada Vane', isAdministrator: true });
    expect((await visitor.get('/api/installation/audit')).body.entries).toEqual([
      expect.objectContaining({ action: 'person.madeAdministrator', actorKind: 'job' }),
    ]);
  }, 30_000);

  it('prints a link to set the password with otherwise', async () => {
    migrate(context.db);
    const { stdout } = run('', ...ADA);
    const secret = /\/reset\/([\w-]+)/.exec(stdout)?.[1];
    const visitor = await visit(createApp(context));
    await visitor.post(`/api/password-resets/${secret}`).send({ password: TEST_PASSWORD }).expect(204);
    await signIn(createApp(context), 'ada@strandline.example');
  }, 30_000);

  it('says what it needs, and stops where the server never ran', () => {
    const short = run('short\n', ...ADA, '--password-stdin');
    expect(short).toMatchObject({ status: 2, stderr: expect.stringContaining('at least 12 characters') });
    const early = run('', ...ADA);
    expect(early.status).toBe(1);
    expect(early.stderr).toContain('start the web server first');
  }, 30_000);
});
