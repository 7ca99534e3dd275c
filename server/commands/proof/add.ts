import { eq } from 'drizzle-orm';
import { v7 as uuidv7 } from 'uuid';
import { testerProofs, testers } from '@/db/schema';
import { errorWords, failedProofWords, proofOutcome, proofSchema } from '@/lib/desk/proof';
import { convertTorque, formatTorque } from '@/lib/torque/units';
import { defineCommand } from '@/server/commands/command';
import { isChecking, lockTesterRow, testerEvents } from '@/server/commands/tester/shared';
import { Problem } from '@/server/problem';

/**
 * Enters a proof of a tester. Whether it passed follows from load, reading and limit. A failed one
 * locks the tester; a passed one lifts a lock, whatever it was for.
 */
export const addProof = defineCommand({
  name: 'proof.add',
  input: proofSchema,
  run: async ({ tx, now, staffId }, { unit, load, reading, limitPercent, ...input }) => {
    const tester = await lockTesterRow(tx, input.testerId);
    const loadNm = convertTorque(load, unit, 'N.m');
    const readingNm = convertTorque(reading, unit, 'N.m');
    if (loadNm < tester.minNm * (1 - 1e-9) || loadNm > tester.maxNm * (1 + 1e-9)) {
      const range = `${formatTorque(tester.minNm, 'N.m')} to ${formatTorque(tester.maxNm, 'N.m')}`;
      const message = `This load lies outside the tester’s range, ${range}.`;
      throw new Problem('invalid', message, { fields: { load: message } });
    }
    const outcome = proofOutcome({ load, reading, limitPercent });
    if (outcome.farOff && !input.sure) {
      throw new Problem(
        'confirm',
        `The tester showed ${errorWords(outcome.errorPercent)} against its load. Look again: are load, reading and unit right?`,
        { question: 'far-off' },
      );
    }
    const { result } = outcome;
    // What was read between a failed proof and the next rests on a tester that was wrong.
    if (result === 'passed' && tester.lockedReason !== null && (await isChecking(tx, tester.id))) {
      throw new Problem(
        'wrong-move',
        `A check from before the lock still runs on ${tester.name}. Sign it off as not judged, or give it up; then the proof can be entered.`,
      );
    }
    const proofId = uuidv7();
    await tx.insert(testerProofs).values({
      id: proofId,
      testerId: tester.id,
      method: input.method,
      loadNm,
      readingNm,
      limitPercent,
      result,
      at: now,
      byStaffId: staffId(),
      note: input.note,
    });
    const locked = result === 'failed';
    const lockedReason = locked ? failedProofWords(outcome, limitPercent) : null;
    await tx.update(testers).set({ lockedReason }).where(eq(testers.id, tester.id));
    const lockLifted = !locked && tester.lockedReason !== null;
    return {
      result: { proofId, result, lockLifted },
      entry: { subjectId: tester.id, detail: { proofId, result, locked, lockLifted } },
      events: await testerEvents(tx, tester.id),
    };
  },
});
