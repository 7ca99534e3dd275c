import type { Logger } from 'pino';
import type { Store } from '@/db/client';
import type { Actor } from '@/server/access/actor';
import type { CommandContext } from '@/server/commands/command';
import type { Env } from '@/server/env';
import type { BoundInstruments } from '@/server/instruments/bind';
import type { LiveHub } from '@/server/live/hub';

/** What the process has opened. One for each process, made by the server file alone. */
export interface Runtime {
  env: Env;
  /** What QR codes and printed addresses carry. */
  origin: string;
  store: Store;
  secret: string;
  clock: () => Date;
  logger: Logger;
  hub: LiveHub;
  instruments: BoundInstruments;
  /** The one-time code of an empty post; null once it has an owner. */
  setupCode: string | null;
}

// Next loads its own copies of our modules, so the one runtime hangs on globalThis.
const holder = globalThis as typeof globalThis & { pullpostRuntime?: Runtime };

export function setRuntime(runtime: Runtime | undefined): void {
  holder.pullpostRuntime = runtime;
}

/** @throws Error when no server has started in this process. */
export function getRuntime(): Runtime {
  if (!holder.pullpostRuntime) {
    throw new Error(
      'Pullpost has not started: run it with npm start, npm run dev or npm run rehearsal.',
    );
  }
  return holder.pullpostRuntime;
}

/** What a command is handed when `actor` runs it in this process. */
export function commandContext(actor: Actor, runtime: Runtime = getRuntime()): CommandContext {
  return {
    db: runtime.store.db,
    actor,
    clock: runtime.clock,
    secret: runtime.secret,
    flush: runtime.store.flush,
    publish: (events, revision) => runtime.hub.publish(events, revision),
  };
}
