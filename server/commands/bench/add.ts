import { eq } from 'drizzle-orm';
import { v7 as uuidv7 } from 'uuid';
import { z } from 'zod';
import { benches } from '@/db/schema';
import { MAX_BENCHES } from '@/lib/desk/meet';
import { defineCommand } from '@/server/commands/command';
import { lockMeet } from '@/server/commands/meet/shared';
import { Problem } from '@/server/problem';
import { benchEntry, benchEvents } from './shared';

/** Adds a bench to a meet, with the next number. */
export const addBench = defineCommand({
  name: 'bench.add',
  input: z.object({ meetId: z.uuid() }),
  run: async ({ tx }, { meetId }) => {
    await lockMeet(tx, meetId);
    const there = await tx
      .select({ number: benches.number })
      .from(benches)
      .where(eq(benches.meetId, meetId));
    if (there.length >= MAX_BENCHES) {
      throw new Problem('wrong-move', `A meet has at most ${MAX_BENCHES} benches.`);
    }
    const number = Math.max(0, ...there.map((bench) => bench.number)) + 1;
    const [bench] = await tx.insert(benches).values({ id: uuidv7(), meetId, number }).returning();
    return {
      result: { benchId: bench!.id, number },
      entry: benchEntry(bench!),
      events: benchEvents(bench!),
    };
  },
});
