import { type Logger, pino } from 'pino';
import { env } from './env';

let logger: Logger | undefined;

/** The server's log: one JSON line an event on standard output, causes included. */
export function log(): Logger {
  logger ??= pino({ level: env().LOG_LEVEL });
  return logger;
}
