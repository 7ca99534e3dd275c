import { and, eq } from 'drizzle-orm';
import { z } from 'zod';
import type { Transaction } from '@/db/client';
import { benches, checks, meets } from '@/db/schema';
import { defineCommand } from '@/server/commands/command';
import { isChecking, lockTesterRow } from '@/server/commands/tester/shared';
import { Problem } from '@/server/problem';
import { benchEntry, benchEvents, benchInput, lockBench, type BenchRow } from './shared';

/** A tester feeds one bench only. @throws Problem that says where it stands. */
async function refuseElsewhere(tx: Transaction, bench: BenchRow, testerId: string): Promise<void> {
  const tester = await lockTesterRow(tx, testerId);
  const [other] = await tx
    .select({ id: benches.id, number: benches.number, meetId: benches.meetId, meet: meets.name })
    .from(benches)
    .innerJoin(meets, eq(meets.id, benches.meetId))
    .where(eq(benches.testerId, testerId));
  if (!other || other.id === bench.id) return;
  const where = `bench ${other.number}${other.meetId === bench.meetId ? '' : ` of ${other.meet}`}`;
  throw new Problem(
    'conflict',
    (await isChecking(tx, testerId))
      ? `${tester.name} stands on ${where}, where a check is running.`
      : `${tester.name} stands on ${where}. A tester feeds one bench: take it off there first.`,
  );
}

/** Puts a tester on a bench, or takes it off. Refused while a check runs on the bench. */
export const setBenchTester = defineCommand({
  name: 'bench.set-tester',
  input: benchInput.extend({ testerId: z.uuid().nullable() }),
  run: async ({ tx }, { benchId, testerId }) => {
    const bench = await lockBench(tx, benchId);
    const [running] = await tx
      .select({ id: checks.id })
      .from(checks)
      .where(and(eq(checks.benchId, bench.id), eq(checks.state, 'running')))
      .limit(1);
    if (running) {
      throw new Problem(
        'wrong-move',
        `A check is running on bench ${bench.number}. Its tester can be changed when that check has ended.`,
      );
    }
    if (testerId) await refuseElsewhere(tx, bench, testerId);
    await tx.update(benches).set({ testerId }).where(eq(benches.id, bench.id));
    return {
      result: { benchId, testerId },
      entry: benchEntry(bench, { testerId, before: bench.testerId }),
      events: [...benchEvents(bench), { kind: 'testers' }],
    };
  },
});
