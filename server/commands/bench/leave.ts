import { eq } from 'drizzle-orm';
import { benches } from '@/db/schema';
import { defineCommand } from '@/server/commands/command';
import { benchEntry, benchEvents, benchInput, lockBench } from './shared';

/** The operator goes; the bench stays as it is for the next one. */
export const leaveBench = defineCommand({
  name: 'bench.leave',
  input: benchInput,
  run: async ({ tx }, { benchId }) => {
    const bench = await lockBench(tx, benchId);
    await tx.update(benches).set({ operatorId: null }).where(eq(benches.id, bench.id));
    return { result: { benchId }, entry: benchEntry(bench), events: benchEvents(bench) };
  },
});
