import { pino, type Logger } from 'pino';
import type { Config } from './config/read-config';

export type { Logger };

/** The process's logger; secrets in headers never reach it. */
export function createLog(config: Pick<Config, 'logLevel'>, name: string): Logger {
  return pino({
    name,
    level: config.logLevel,
    redact: [
      'req.headers.cookie',
      'req.headers.authorization',
      'req.headers["x-xsrf-token"]',
      'res.headers["set-cookie"]',
    ],
  });
}
