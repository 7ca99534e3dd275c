import { and, eq, ne } from 'drizzle-orm';
import { benches } from '@/db/schema';
import { defineCommand } from '@/server/commands/command';
import { Problem } from '@/server/problem';
import { benchEntry, benchEvents, benchInput, lockBench } from './shared';

/** An operator takes a bench. One who still has another bench of the meet leaves that one. */
export const takeBench = defineCommand({
  name: 'bench.take',
  input: benchInput,
  run: async ({ tx, staffId, standing }, { benchId }) => {
    const bench = await lockBench(tx, benchId);
    const me = staffId();
    if (bench.operatorId && bench.operatorId !== me && standing === 'operator') {
      throw new Problem('conflict', `Bench ${bench.number} is taken. A lead can take it over.`);
    }
    const left = await tx
      .update(benches)
      .set({ operatorId: null })
      .where(
        and(eq(benches.meetId, bench.meetId), eq(benches.operatorId, me), ne(benches.id, bench.id)),
      )
      .returning();
    await tx.update(benches).set({ operatorId: me }).where(eq(benches.id, bench.id));
    return {
      result: { benchId },
      entry: benchEntry(bench),
      events: [
        ...benchEvents(bench),
        ...left.map((row) => ({ kind: 'bench' as const, benchId: row.id })),
      ],
    };
  },
});
