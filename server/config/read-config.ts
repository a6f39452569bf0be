import { resolve } from 'node:path';
import * as z from 'zod';

const DEFAULT_SECRET = 'not-secret-for-development-only';

const Environment = z.object({
  NODE_ENV: z.enum(['production', 'development', 'test']).default('development'),
  PORT: z.coerce.number().int().min(0).max(65535).default(3000),
  HOST: z.string().optional(),
  PUBLIC_URL: z.url().optional(),
  STRANDLINE_DATA_DIR: z.string().default('data'),
  SESSION_SECRET: z.string().min(24, 'use at least 24 characters').default(DEFAULT_SECRET),
  SMTP_URL: z.string().optional(),
  MAIL_FROM: z.string().default('Strandline <strandline@localhost>'),
  MAILBOX_PORT: z.coerce.number().int().min(0).max(65535).default(3025),
  STRANDLINE_DEMO: z.enum(['auto', 'on', 'off']).default('auto'),
  MAX_UPLOAD_MB: z.coerce.number().min(1).max(500).default(25),
  TRUST_PROXY: z.coerce.number().int().min(0).max(10).default(0),
  LOG_LEVEL: z.enum(['fatal', 'error', 'warn', 'info', 'debug', 'silent']).default('info'),
});

export interface Config {
  readonly isProduction: boolean;
  readonly port: number;
  readonly host: string;
  /** Where people reach the pages; the start of every link in a mail, without a slash at the end. */
  readonly publicUrl: string;
  readonly dataDir: string;
  readonly databaseFile: string;
  readonly originalsDir: string;
  readonly sessionSecret: string;
  /** SMTP server of the installation, or the local mailbox that keeps mail on this machine. */
  readonly mail: { readonly kind: 'smtp'; readonly url: string } | { readonly kind: 'local'; readonly port: number };
  readonly mailFrom: string;
  /** Whether an empty data folder is filled with the demo. */
  readonly seedsDemo: boolean;
  readonly maxUploadBytes: number;
  readonly trustedProxies: number;
  readonly logLevel: z.infer<typeof Environment>['LOG_LEVEL'];
}

/**
 * Reads the configuration from environment variables, once, at the start.
 *
 * @throws Error naming every variable that is missing or wrong; production needs SESSION_SECRET, SMTP_URL and PUBLIC_URL
 */
export function readConfig(environment: NodeJS.ProcessEnv): Config {
  const given = Object.fromEntries(Object.entries(environment).filter(([, value]) => value !== ''));
  const parsed = Environment.safeParse(given);
  if (!parsed.success) {
    const lines = parsed.error.issues.map(
      ({ path, message }) => `${path.join('.')}: ${message}${found(given, path[0])}`,
    );
    throw new Error(`The configuration is wrong.\n${lines.join('\n')}`);
  }
  const values = parsed.data;
  const isProduction = values.NODE_ENV === 'production';
  if (isProduction) refuseUnsafeProduction(values);
  const dataDir = resolve(values.STRANDLINE_DATA_DIR);
  return Object.freeze<Config>({
    isProduction,
    port: values.PORT,
    // Outside production the sign-ins of the demo are public, so only this machine may connect.
    host: values.HOST ?? (isProduction ? '0.0.0.0' : '127.0.0.1'),
    publicUrl: (values.PUBLIC_URL ?? `http://localhost:${values.PORT}`).replace(/\/+$/, ''),
    dataDir,
    databaseFile: resolve(dataDir, 'strandline.db'),
    originalsDir: resolve(dataDir, 'originals'),
    sessionSecret: values.SESSION_SECRET,
    mail: values.SMTP_URL ? { kind: 'smtp', url: values.SMTP_URL } : { kind: 'local', port: values.MAILBOX_PORT },
    mailFrom: values.MAIL_FROM,
    seedsDemo: values.STRANDLINE_DEMO === 'on' || (values.STRANDLINE_DEMO === 'auto' && !isProduction),
    maxUploadBytes: values.MAX_UPLOAD_MB * 1024 * 1024,
    trustedProxies: values.TRUST_PROXY,
    logLevel: values.LOG_LEVEL,
  });
}

/** The offending value, unless it may hold a password. */
function found(given: Record<string, string | undefined>, name: PropertyKey | undefined): string {
  const isSecret = name === 'SESSION_SECRET' || name === 'SMTP_URL';
  return isSecret || typeof name !== 'string' ? '' : `, found "${given[name]}"`;
}

function refuseUnsafeProduction(values: z.infer<typeof Environment>): void {
  const missing: string[] = [];
  if (values.SESSION_SECRET === DEFAULT_SECRET || values.SESSION_SECRET.startsWith('change-me')) {
    missing.push('SESSION_SECRET: production needs a secret of its own (openssl rand -hex 32)');
  }
  if (!values.SMTP_URL) missing.push('SMTP_URL: production needs a mail server, such as smtp://mail.example:587');
  if (!values.PUBLIC_URL) missing.push('PUBLIC_URL: production needs the address people use, for the links in mails');
  if (values.STRANDLINE_DEMO === 'on')
    missing.push('STRANDLINE_DEMO: the demo has public passwords and is refused in production');
  if (missing.length > 0) throw new Error(`The configuration is not safe for production.\n${missing.join('\n')}`);
}
