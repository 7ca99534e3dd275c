import { and, desc, eq, sql } from 'drizzle-orm';
import { v7 as uuidv7 } from 'uuid';
import type { Transaction } from '@/db/client';
import { certificates, ledger, testers } from '@/db/schema';
import { certificateSchema } from '@/lib/desk/certificate';
import { outsideRangeFault, pointsInNm } from '@/lib/desk/certificate-points';
import { defineCommand } from '@/server/commands/command';
import { isChecking, lockTesterRow, testerEvents } from '@/server/commands/tester/shared';
import { Problem } from '@/server/problem';

const isoDay = (instant: Date): string => instant.toISOString().slice(0, 10);

/** The day (UTC) on which the tester was locked last, from the ledger; null when it never was. */
async function lockedOn(tx: Transaction, testerId: string): Promise<string | null> {
  const [entry] = await tx
    .select({ at: ledger.at })
    .from(ledger)
    .where(and(eq(ledger.subjectId, testerId), sql`${ledger.detail} ->> 'locked' = 'true'`))
    .orderBy(desc(ledger.sequence))
    .limit(1);
  return entry ? isoDay(entry.at) : null;
}

/**
 * Enters a certificate. One that was issued after the tester was locked, and is still valid, lifts
 * the lock: a laboratory has looked at it since.
 */
export const addCertificate = defineCommand({
  name: 'certificate.add',
  input: certificateSchema,
  run: async ({ tx, now }, { unit, points: printed, ...input }) => {
    const tester = await lockTesterRow(tx, input.testerId);
    const points = pointsInNm(printed, unit);
    const fault = outsideRangeFault(points, tester, unit);
    if (fault) throw new Problem('invalid', fault, { fields: { points: fault } });
    if (input.issuedOn > isoDay(new Date(now.getTime() + 86_400_000))) {
      const message = 'This certificate is dated in the future.';
      throw new Problem('invalid', message, { fields: { issuedOn: message } });
    }
    const certificateId = uuidv7();
    await tx.insert(certificates).values({ id: certificateId, ...input, points, createdAt: now });

    const since = tester.lockedReason === null ? null : await lockedOn(tx, tester.id);
    const lockLifted =
      since !== null &&
      input.issuedOn >= since &&
      input.dueOn >= isoDay(now) &&
      !(await isChecking(tx, tester.id));
    if (lockLifted)
      await tx.update(testers).set({ lockedReason: null }).where(eq(testers.id, tester.id));
    return {
      result: { certificateId, lockLifted },
      entry: { subjectId: tester.id, detail: { certificateId, number: input.number, lockLifted } },
      events: await testerEvents(tx, tester.id),
    };
  },
});
