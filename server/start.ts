import path from 'node:path';
import type { AddressInfo } from 'node:net';
import { lockDataFolder } from '@/db/lock';
import { openStore } from '@/db/client';
import { lanOrigin, type Env } from './env';
import { createWebServer } from './http';
import { bindInstruments } from './instruments/bind';
import { watchHolds } from './jobs/holds';
import { createHub } from './live/hub';
import { connectProcesses } from './live/processes';
import { createSocketServer } from './live/socket';
import { createLogger } from './logger';
import { setRuntime, type Runtime } from './runtime';
import { readSecret } from './secret';
import { setupCodeFor, setupWords } from './setup-code';

export interface RunningServer {
  runtime: Runtime;
  port: number;
  close(): Promise<void>;
}

interface StartOptions {
  dev: boolean;
  clock?: () => Date;
  /** Runs once the store is open and before anybody is served: seeds of the rehearsal. */
  prepare?: (runtime: Runtime) => Promise<void>;
}

const ROOT = path.join(import.meta.dirname, '..');

/**
 * Starts everything in order: lock → store and migrations → live channel → instruments → Next →
 * listen. `close` goes the other way round, the store last.
 */
export async function startServer(env: Env, options: StartOptions): Promise<RunningServer> {
  const clock = options.clock ?? (() => new Date());
  const logger = createLogger(env.logLevel);
  const lock = env.databaseUrl ? null : await lockDataFolder(env.dataDir, clock());
  const store = await openStore(
    env.databaseUrl
      ? { kind: 'postgres', url: env.databaseUrl }
      : { kind: 'folder', dataDir: path.join(env.dataDir, 'db') },
  );
  const secret = readSecret(env.dataDir, env.secret);
  const web = createWebServer({ dev: options.dev, dir: ROOT, port: env.port });

  const hub = createHub({
    db: store.db,
    clock,
    secret,
    logger,
    instruments: () => runtime.instruments,
    shared: store.kind === 'postgres',
  });
  const runtime: Runtime = {
    env,
    origin: env.origin ?? lanOrigin(env.port),
    store,
    secret,
    clock,
    logger,
    hub,
    instruments: bindInstruments({ store, clock, secret, logger, hub }),
    setupCode: null,
  };
  setRuntime(runtime);
  const sockets = createSocketServer({
    http: web.http,
    db: store.db,
    clock,
    secret,
    logger,
    instruments: () => runtime.instruments,
  });
  const processes = await connectProcesses(sockets.io, env.databaseUrl);
  hub.attach(sockets.io);

  await options.prepare?.(runtime);
  runtime.setupCode = await setupCodeFor(store.db);
  await runtime.instruments.follow();
  await web.prepare();
  await new Promise<void>((resolve, reject) => {
    web.http.once('error', reject);
    web.http.listen(env.port, env.host, resolve);
  });
  const { port } = web.http.address() as AddressInfo;
  if (!env.origin) runtime.origin = lanOrigin(port);
  if (runtime.setupCode) logger.warn(setupWords(runtime.setupCode, runtime.origin));
  logger.info({ port, origin: runtime.origin, store: store.kind }, 'Pullpost is open');

  const holds = watchHolds({
    db: store.db,
    clock,
    publish: hub.publish,
    onError: (error) => logger.error({ err: error }, 'holds could not be followed'),
  });

  return {
    runtime,
    port,
    async close() {
      holds.stop();
      hub.close();
      await sockets.close();
      await web.close();
      await processes.close();
      await runtime.instruments.close();
      setRuntime(undefined);
      await store.close();
      await lock?.release();
    },
  };
}
