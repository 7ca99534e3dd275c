import type { Runtime } from '@/server/runtime';
import { refuseOthers, seed as tellStory } from './seed';
import { markAsRehearsal } from './start-over';

export { open } from './open';
export { startOver } from './start-over';

/** Fills an empty store with the made-up meet, and marks its folder as a rehearsal's. */
export async function seed(runtime: Runtime): Promise<void> {
  await refuseOthers(runtime.store.db);
  markAsRehearsal(runtime.env);
  await tellStory(runtime);
  // The owner's account is there, so that nobody else may set the post up.
  runtime.setupCode = null;
}
