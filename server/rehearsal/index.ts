import { isSetUp } from '@/server/queries/staff/any';
import type { Runtime } from '@/server/runtime';
import { openNewDay } from './new-day';
import { refuseOthers, seed as tellStory } from './seed';
import { markAsRehearsal } from './start-over';

export { open } from './open';
export { startOver } from './start-over';

/** Fills an empty store with the made-up meet, or opens one of an earlier day again. */
export async function seed(runtime: Runtime): Promise<void> {
  const { store, secret, clock } = runtime;
  await refuseOthers(store.db);
  markAsRehearsal(runtime.env);
  if (!(await isSetUp(store.db))) {
    console.log('\n  Setting up a made-up meet. This takes some seconds, once.');
  }
  await tellStory(runtime);
  await openNewDay({ db: store.db, secret, clock, publish: () => undefined });
}
