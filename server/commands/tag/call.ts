import { and, eq } from 'drizzle-orm';
import { z } from 'zod';
import { meets, tags } from '@/db/schema';
import { nextTag } from '@/lib/line/order';
import { lockBench } from '@/server/commands/bench/shared';
import { defineCommand } from '@/server/commands/command';
import { Problem } from '@/server/problem';
import { lockTag, saveMove, tagEntry, tagEvents, tagsAtBench } from './shared';

/**
 * Calls a tag to a bench: the given one, or the next in the line. A tool that was left with us needs
 * no call: it goes straight on the bench.
 */
export const callTag = defineCommand({
  name: 'tag.call',
  input: z.object({ benchId: z.uuid(), tagId: z.uuid().nullable().default(null) }),
  run: async ({ tx, now }, input) => {
    const bench = await lockBench(tx, input.benchId);
    if (bench.state !== 'open') {
      throw new Problem(
        'wrong-move',
        `Bench ${bench.number} is ${bench.state}. Open it before you call.`,
      );
    }
    const busy = (await tagsAtBench(tx, bench.id))[0];
    if (busy) {
      throw new Problem(
        'wrong-move',
        busy.place === 'bench'
          ? `${busy.code} still lies on bench ${bench.number}: hand it back or hang it on a peg first.`
          : `${busy.code} is called to bench ${bench.number} already.`,
      );
    }
    let tagId = input.tagId;
    if (tagId === null) {
      // Two benches that call the next at once do it one after the other.
      await tx.select({ id: meets.id }).from(meets).where(eq(meets.id, bench.meetId)).for('update');
      const waiting = await tx
        .select()
        .from(tags)
        .where(and(eq(tags.meetId, bench.meetId), eq(tags.state, 'waiting')));
      tagId = nextTag(waiting, now)?.id ?? null;
      if (tagId === null) throw new Problem('wrong-move', 'Nobody is waiting.');
    }
    const tag = await lockTag(tx, tagId);
    if (tag.meetId !== bench.meetId)
      throw new Problem('not-found', 'There is no such tag at this meet.');
    if (tag.state !== 'waiting' && tag.benchId) {
      throw new Problem('conflict', `${tag.code} has just been called or taken by another bench.`);
    }
    const moved =
      tag.place === 'visitor'
        ? await saveMove(tx, tag, { kind: 'call', benchId: bench.id }, now, { calledAt: now })
        : await saveMove(tx, tag, { kind: 'take-on-bench', benchId: bench.id }, now);
    return {
      result: { tagId: moved.id, code: moved.code, state: moved.state },
      entry: tagEntry(moved, { bench: bench.number }),
      events: tagEvents(moved),
    };
  },
});
