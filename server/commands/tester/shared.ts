import { and, eq, ne } from 'drizzle-orm';
import type { Transaction } from '@/db/client';
import { benches, checks, testers } from '@/db/schema';
import type { TesterDescription } from '@/lib/desk/tester';
import { convertTorque } from '@/lib/torque/units';
import type { LiveEvent } from '@/server/live/events';
import { Problem } from '@/server/problem';

export type TesterRow = typeof testers.$inferSelect;

/** Loads a tester and takes its row for the transaction. @throws Problem `not-found`. */
export async function lockTesterRow(tx: Transaction, testerId: string): Promise<TesterRow> {
  const [tester] = await tx.select().from(testers).where(eq(testers.id, testerId)).for('update');
  if (!tester) throw new Problem('not-found', 'There is no such tester.');
  return tester;
}

/** A tester as it was typed, as it is stored. */
export function testerValues({ unit, min, max, resolution, ...rest }: TesterDescription) {
  return {
    ...rest,
    minNm: convertTorque(min, unit, 'N.m'),
    maxNm: convertTorque(max, unit, 'N.m'),
    resolutionNm: convertTorque(resolution, unit, 'N.m'),
  };
}

/** @throws Problem `invalid` when another tester has this name. */
export async function refuseTakenName(
  tx: Transaction,
  name: string,
  ownId: string | null = null,
): Promise<void> {
  const [other] = await tx
    .select({ id: testers.id })
    .from(testers)
    .where(and(eq(testers.name, name), ownId === null ? undefined : ne(testers.id, ownId)));
  if (!other) return;
  const message = 'Another tester has this name. Each needs its own.';
  throw new Problem('invalid', message, { fields: { name: message } });
}

/** Does a check run on this tester now? */
export async function isChecking(tx: Transaction, testerId: string): Promise<boolean> {
  const [running] = await tx
    .select({ id: checks.id })
    .from(checks)
    .where(and(eq(checks.testerId, testerId), eq(checks.state, 'running')))
    .limit(1);
  return running !== undefined;
}

/** The desk, the bench where the tester stands, and its connection are read anew. */
export async function testerEvents(tx: Transaction, testerId: string): Promise<LiveEvent[]> {
  const [bench] = await tx.select().from(benches).where(eq(benches.testerId, testerId));
  return [
    { kind: 'testers' },
    ...(bench
      ? [
          { kind: 'line' as const, meetId: bench.meetId },
          { kind: 'bench' as const, benchId: bench.id },
        ]
      : []),
  ];
}
