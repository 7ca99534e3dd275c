import { parseArgs } from 'node:util';
import { DataFolderLockedError } from '@/db/lock';

const { values: flags } = parseArgs({
  options: {
    dev: { type: 'boolean', default: false },
    rehearsal: { type: 'boolean', default: false },
    fresh: { type: 'boolean', default: false },
    visitors: { type: 'boolean', default: false },
  },
});

/** Errors at start that a person can act on; anything else keeps its stack. */
function wordsFor(error: unknown, dataDir: string): string | null {
  if (error instanceof DataFolderLockedError) return error.message;
  const { code, message } = error as NodeJS.ErrnoException;
  if (code === 'EACCES' || code === 'EROFS' || code === 'EPERM') {
    return `The data folder ${dataDir} cannot be written (${code}). Make it writable for this user, or set PULLPOST_DATA.`;
  }
  if (code === 'EADDRINUSE')
    return `The port is in use by another program (${message}). Set PORT to a free one.`;
  if (code === 'ENOSPC') return `The disk of the data folder ${dataDir} is full.`;
  return error instanceof Error && error.message.startsWith('The configuration') ? message : null;
}

async function main(): Promise<void> {
  // Read before Next is loaded: it decides by NODE_ENV what it is.
  Object.assign(process.env, {
    NODE_ENV: flags.dev ? 'development' : 'production',
    NEXT_TELEMETRY_DISABLED: '1',
  });
  if (flags.rehearsal) {
    process.env.PULLPOST_DATA ??= '.data/rehearsal';
    // What is printed for people should not drown in the log.
    process.env.LOG_LEVEL ||= 'warn';
  }
  const { readEnv } = await import('./env');
  let dataDir = process.env.PULLPOST_DATA ?? '.data/post';
  try {
    const env = readEnv();
    dataDir = env.dataDir;
    const { startServer } = await import('./start');
    const rehearsal = flags.rehearsal ? await import('./rehearsal') : null;
    if (flags.fresh) await rehearsal?.startOver(env);
    const server = await startServer(env, { dev: flags.dev, prepare: rehearsal?.seed });
    const play = await rehearsal?.open(server, { visitors: flags.visitors });

    const stop = async (): Promise<void> => {
      await play?.stop();
      await server.close();
      process.exit(0);
    };
    process.once('SIGINT', stop);
    process.once('SIGTERM', stop);
  } catch (error) {
    const words = wordsFor(error, dataDir);
    console.error(words ? `\n${words}\n` : error);
    process.exit(1);
  }
}

void main();
