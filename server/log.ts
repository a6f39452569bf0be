import { pino, type Logger } from 'pino';
import type { Config } from './config/read-config';

export type { Logger };

/** The process's logger. */
export function createLog(config: Pick<Config, 'logLevel'>, name: string): Logger {
  return pino({ name, level: config.logLevel });
}
