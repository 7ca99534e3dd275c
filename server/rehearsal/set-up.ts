import { eq } from 'drizzle-orm';
import { benches, meets, posts, staff } from '@/db/schema';
import type { Database } from '@/db/client';
import { setBenchTester } from '@/server/commands/bench/set-tester';
import { addCertificate } from '@/server/commands/certificate/add';
import { addTester } from '@/server/commands/tester/add';
import { accountRows } from './accounts';
import { BENCH_IDS, MEET_ID, POST_ID } from './ids';
import { meetRow, POST } from './place';
import { settingOf, type Setting } from './setting';
import type { Run, Stage } from './stage';
import { CAST_TESTERS, certificateInput } from './testers';

/** Post, people, meet and benches: written with fixed ids, which addresses and tests rest on. */
async function found(db: Database, opened: Date, createdAt: Date): Promise<void> {
  const [there] = await db.select({ id: posts.id }).from(posts).where(eq(posts.id, POST_ID));
  if (there) return;
  // Hashing is slow, so it is done before the transaction.
  const people = await accountRows(createdAt);
  await db.transaction(async (tx) => {
    await tx.insert(posts).values({ id: POST_ID, ...POST, createdAt });
    await tx.insert(staff).values(people);
    await tx.insert(meets).values(meetRow(opened, createdAt));
    await tx
      .insert(benches)
      .values(BENCH_IDS.map((id, index) => ({ id, meetId: MEET_ID, number: index + 1 })));
  });
}

/** Sets the post up, with a tester and its certificate on each bench. */
export async function setUp(stage: Stage, run: Run, opened: Date): Promise<Setting> {
  await found(stage.db, opened, stage.clock());
  const { lead } = await settingOf(stage.db);
  for (const [index, cast] of CAST_TESTERS.entries()) {
    const { testerId } = await run(addTester, lead, cast.tester);
    await run(addCertificate, lead, certificateInput(testerId, cast, opened));
    await run(setBenchTester, lead, { benchId: BENCH_IDS[index]!, testerId });
  }
  return settingOf(stage.db);
}
