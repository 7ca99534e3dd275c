import { z } from 'zod';
import { lockBench } from '@/server/commands/bench/shared';
import { defineCommand } from '@/server/commands/command';
import { Problem } from '@/server/problem';
import { lockTag, saveMove, tagEntry, tagEvents, tagInput, tagsAtBench } from './shared';

/** The tool lies on the bench: its owner came, it was left with us, or it is checked a second time. */
export const takeOnBench = defineCommand({
  name: 'tag.take-on-bench',
  input: tagInput.extend({ benchId: z.uuid() }),
  run: async ({ tx, now }, input) => {
    const bench = await lockBench(tx, input.benchId);
    if (bench.state !== 'open')
      throw new Problem('wrong-move', `Bench ${bench.number} is ${bench.state}.`);
    const tag = await lockTag(tx, input.tagId);
    if (tag.meetId !== bench.meetId)
      throw new Problem('not-found', 'There is no such tag at this meet.');
    const other = (await tagsAtBench(tx, bench.id)).find((row) => row.id !== tag.id);
    if (other) {
      throw new Problem(
        'wrong-move',
        other.place === 'bench'
          ? `${other.code} still lies on bench ${bench.number}: hand it back or hang it on a peg first.`
          : `${other.code} is called to bench ${bench.number}: mark it away first.`,
      );
    }
    const moved = await saveMove(tx, tag, { kind: 'take-on-bench', benchId: bench.id }, now);
    return {
      result: { tagId: moved.id, benchId: bench.id },
      entry: tagEntry(moved, { bench: bench.number }),
      events: tagEvents(moved, tag.benchId),
    };
  },
});
