import type { RunningServer } from '@/server/start';
import { announcement } from './announce';
import { startVisitors } from './play';

export interface Play {
  stop(): Promise<void>;
}

/** Prints where everything is and, when asked to, lets simulated visitors in. */
export async function open(
  { runtime, port }: RunningServer,
  { visitors }: { visitors: boolean },
): Promise<Play> {
  const { store, secret, origin } = runtime;
  const colours = process.stdout.isTTY === true;
  console.log(await announcement({ db: store.db, secret, origin, port, visitors, colours }));
  return visitors ? startVisitors(runtime) : { stop: async () => undefined };
}
