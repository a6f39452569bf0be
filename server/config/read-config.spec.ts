import { readConfig } from './read-config';

const production = {
  NODE_ENV: 'production',
  SESSION_SECRET: 'a-secret-of-this-installation',
  SMTP_URL: 'smtp://mail.example:587',
  PUBLIC_URL: 'https://emissions.example/',
};

describe('readConfig', () => {
  it('works without any variable in development, on this machine only', () => {
    const config = readConfig({});
    expect(config).toMatchObject({ port: 3000, host: '127.0.0.1', seedsDemo: true, mail: { kind: 'local' } });
  });

  it.each(['SESSION_SECRET', 'SMTP_URL', 'PUBLIC_URL'])('refuses production without %s', (name) => {
    expect(() => readConfig({ ...production, [name]: '' })).toThrow(name);
  });

  it('refuses the default and the example secret in production', () => {
    expect(() => readConfig({ ...production, SESSION_SECRET: 'not-secret-for-development-only' })).toThrow(
      'SESSION_SECRET',
    );
    expect(() => readConfig({ ...production, SESSION_SECRET: 'change-me-to-a-long-random-text' })).toThrow(
      'SESSION_SECRET',
    );
  });

  it('never seeds the demo in production', () => {
    expect(readConfig(production).seedsDemo).toBe(false);
    expect(() => readConfig({ ...production, STRANDLINE_DEMO: 'on' })).toThrow('STRANDLINE_DEMO');
  });

  it('names the offending variable and value, but never a secret', () => {
    expect(() => readConfig({ PORT: 'eighty' })).toThrow(/PORT: .*found "eighty"/);
    expect(() => readConfig({ SESSION_SECRET: 'too short' })).toThrow(/^((?!too short).)*$/s);
  });
});
