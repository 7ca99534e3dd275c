import { and, desc, eq, lte } from 'drizzle-orm';
import type { Reader } from '@/db/client';
import { certificates, testerProofs, testers } from '@/db/schema';
import { serviceDay } from '@/lib/time/service-day';
import { barredReasons } from '@/lib/torque/barred';
import type { BarredReason } from '@/lib/torque/verdict';

export interface TesterToday {
  tester: typeof testers.$inferSelect;
  /** The newest certificate that was issued by today; null when there is none. */
  certificate: typeof certificates.$inferSelect | null;
  /** The newest proof of this service day; null when there is none. */
  proof: typeof testerProofs.$inferSelect | null;
  barred: BarredReason[];
}

/** What a tester rests on today, in the zone and service day of the meet. */
export async function testerToday(
  reader: Reader,
  testerId: string,
  meet: { timeZone: string; dayStartHour: number },
  now: Date,
): Promise<TesterToday | null> {
  const today = serviceDay(now, meet.timeZone, meet.dayStartHour);
  const [tester] = await reader.select().from(testers).where(eq(testers.id, testerId));
  if (!tester) return null;
  const [certificate = null] = await reader
    .select()
    .from(certificates)
    .where(and(eq(certificates.testerId, testerId), lte(certificates.issuedOn, today)))
    .orderBy(desc(certificates.issuedOn), desc(certificates.createdAt))
    .limit(1);
  const [newest] = await reader
    .select()
    .from(testerProofs)
    .where(eq(testerProofs.testerId, testerId))
    .orderBy(desc(testerProofs.at))
    .limit(1);
  const proof =
    newest && serviceDay(newest.at, meet.timeZone, meet.dayStartHour) === today ? newest : null;
  return {
    tester,
    certificate,
    proof,
    barred: barredReasons({ lockedReason: tester.lockedReason, certificate, proof, today }),
  };
}
