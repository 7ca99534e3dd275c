import { eq } from 'drizzle-orm';
import { benches } from '@/db/schema';
import type { BenchState } from '@/lib/line/states';
import { defineCommand } from '@/server/commands/command';
import { reason, tagsAtBench } from '@/server/commands/tag/shared';
import type { Permission } from '@/server/access/policy';
import { Problem } from '@/server/problem';
import { benchEntry, benchEvents, benchInput, lockBench } from './shared';

const setState = <Name extends Permission>(name: Name, state: BenchState) =>
  defineCommand({
    name,
    input: benchInput.extend({ reason: reason.nullable().default(null) }),
    run: async ({ tx, standing }, input) => {
      const bench = await lockBench(tx, input.benchId);
      if (bench.state === 'closed' && standing === 'operator') {
        throw new Problem('forbidden', `A lead has closed bench ${bench.number}, and can open it.`);
      }
      if (state === 'closed') {
        const busy = (await tagsAtBench(tx, bench.id))[0];
        if (busy)
          throw new Problem('wrong-move', `${busy.code} is still at bench ${bench.number}.`);
      }
      await tx
        .update(benches)
        .set({ state, pausedReason: state === 'paused' ? input.reason : null })
        .where(eq(benches.id, bench.id));
      return {
        result: { benchId: bench.id, state },
        entry: benchEntry(bench, { state, reason: input.reason }),
        events: benchEvents(bench),
      };
    },
  });

/** Calls nobody for a while. A check in progress goes on. */
export const pauseBench = setState('bench.pause', 'paused');
export const openBench = setState('bench.open', 'open');
/** Takes the bench out of the line; refused while a tool is at it. */
export const closeBench = setState('bench.close', 'closed');
