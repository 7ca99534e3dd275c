import pino, { type Logger } from 'pino';

/**
 * The process's log. Addresses of tickets and records are secrets: only their first part is kept,
 * and no form content is ever logged.
 */
export function createLogger(level: string): Logger {
  return pino({ level, base: undefined, timestamp: pino.stdTimeFunctions.isoTime });
}

/** A request path that may stand in the log. */
export const loggablePath = (path: string): string =>
  path.split('?', 1)[0]!.replace(/^\/(t|r|h)\/[^/]+/, '/$1/…');
