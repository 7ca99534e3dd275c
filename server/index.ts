import { parseArgs } from 'node:util';
import { startWords } from './start-words';

const { values: flags } = parseArgs({
  options: {
    dev: { type: 'boolean', default: false },
    rehearsal: { type: 'boolean', default: false },
    fresh: { type: 'boolean', default: false },
    visitors: { type: 'boolean', default: false },
  },
});

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
  let where = { dataDir: '', host: '', port: 0, hasDatabaseUrl: false };
  try {
    const env = readEnv();
    where = { ...env, hasDatabaseUrl: env.databaseUrl !== null };
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
    const words = startWords(error, where);
    console.error(words ? `\n${words}\n` : error);
    process.exit(1);
  }
}

void main();
