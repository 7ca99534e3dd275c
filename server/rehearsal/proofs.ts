import { testerProofs } from '@/db/schema';
import type { Script } from './director';
import { fixedId, STAFF_IDS, TESTER_IDS } from './ids';
import type { Telling } from './told';

/** This morning's proofs. The second bench had begun before its tester was proved. */
const PROOFS = [
  { testerId: TESTER_IDS[0], at: 168, loadNm: 98.13, readingNm: 98.19, note: '10 kg at 1 m' },
  { testerId: TESTER_IDS[1], at: 145, loadNm: 196.26, readingNm: 196.4, note: '20 kg at 1 m' },
] as const;

const LIMIT_PERCENT = 0.5;

async function* proofScript(telling: Telling, index: number): Script {
  const { at, ...proof } = PROOFS[index]!;
  yield telling.ago(at);
  await telling.stage.db
    .insert(testerProofs)
    .values({
      id: fixedId(0x51 + index),
      ...proof,
      method: 'dead-weight',
      limitPercent: LIMIT_PERCENT,
      result: 'passed',
      at: telling.ago(at),
      byStaffId: STAFF_IDS.lead,
    })
    .onConflictDoNothing();
}

export const proofScripts = (telling: Telling): Script[] =>
  PROOFS.map((_, index) => proofScript(telling, index));
