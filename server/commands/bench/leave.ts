import { eq } from 'drizzle-orm';
import { benches } from '@/db/schema';
import { defineCommand } from '@/server/commands/command';
import { Problem } from '@/server/problem';
import { benchEntry, benchEvents, benchInput, lockBench } from './shared';

/** The operator goes; the bench stays as it is for the next one. A lead can free any bench. */
export const leaveBench = defineCommand({
  name: 'bench.leave',
  input: benchInput,
  run: async ({ tx, staffId, standing }, { benchId }) => {
    const bench = await lockBench(tx, benchId);
    if (bench.operatorId !== staffId() && standing === 'operator') {
      throw new Problem(
        'forbidden',
        `You do not work at bench ${bench.number}. A lead can free it.`,
      );
    }
    await tx.update(benches).set({ operatorId: null }).where(eq(benches.id, bench.id));
    return { result: { benchId }, entry: benchEntry(bench), events: benchEvents(bench) };
  },
});
