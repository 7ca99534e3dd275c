import pino, { type Logger } from 'pino';

/**
 * The process's log. Addresses of tickets and records are secrets: only their first part is kept,
 * and no form content is ever logged.
 */
export function createLogger(level: string, to?: pino.DestinationStream): Logger {
  return pino(
    {
      level,
      base: undefined,
      timestamp: pino.stdTimeFunctions.isoTime,
      serializers: { err: loggableError },
    },
    to,
  );
}

/** The lines of a stack below its message. */
const frames = (stack: string | undefined): string =>
  (stack ?? '')
    .split('\n')
    .filter((line) => /^\s+at /.test(line))
    .join('\n');

/**
 * An error that may stand in the log. One of a statement carries the values of that statement in its
 * message, its parameters and the store's own detail: names and mail addresses. Those stay out.
 */
export function loggableError(error: unknown): unknown {
  if (!(error instanceof Error) || !('query' in error && 'params' in error)) {
    return pino.stdSerializers.err(error as Error);
  }
  const cause = error.cause instanceof Error ? error.cause : null;
  const told = (key: 'code' | 'constraint' | 'table' | 'column') =>
    cause && key in cause ? (cause as unknown as Record<string, unknown>)[key] : undefined;
  return {
    type: error.name,
    message: cause?.message ?? 'a statement failed',
    code: told('code'),
    constraint: told('constraint'),
    table: told('table'),
    column: told('column'),
    query: error.query,
    stack: frames(error.stack),
  };
}

/** A request path that may stand in the log. */
export const loggablePath = (path: string): string =>
  path.split('?', 1)[0]!.replace(/^\/(t|r|h)\/[^/]+/, '/$1/…');
