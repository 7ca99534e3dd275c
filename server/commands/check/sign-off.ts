import { createHash } from 'node:crypto';
import { and, eq, max } from 'drizzle-orm';
import { v7 as uuidv7 } from 'uuid';
import { checks, meets, posts, records } from '@/db/schema';
import { canonical } from '@/lib/record/canonical';
import { localYear } from '@/lib/time/service-day';
import { hashToken, linkToken } from '@/server/access/links';
import { defineCommand } from '@/server/commands/command';
import { lockTag, saveMove } from '@/server/commands/tag/shared';
import { Problem } from '@/server/problem';
import { checkEntry, checkInput, endEvents, lockCheck } from './shared';
import { signedRecord } from './signed-record';

/** How many missing pulls a refusal names. */
const NAMED = 4;

function refuseMissing(missing: string[]): never {
  const named = missing.slice(0, NAMED).join('; ');
  const more = missing.length > NAMED ? ` and ${missing.length - NAMED} more` : '';
  throw new Problem(
    'wrong-move',
    `Not yet: ${named}${more}. Take them, or stop early and say why.`,
  );
}

/**
 * Signs a check off: one self-contained canonical text, numbered post-year-sequence, that is never
 * altered. Refused while a reading is missing, unless the check was stopped early.
 */
export const signOff = defineCommand({
  name: 'check.sign-off',
  input: checkInput,
  run: async ({ tx, now, secret, staffId }, { checkId }) => {
    const file = await lockCheck(tx, checkId);
    const offered = file.pulls.find(({ accepted, voided }) => !accepted && !voided);
    if (offered)
      throw new Problem('wrong-move', 'A value of the tester still waits: accept it, or void it.');

    const [meet] = await tx.select().from(meets).where(eq(meets.id, file.check.meetId));
    // The post's row is taken so that no number is given out twice.
    const [post] = await tx.select().from(posts).where(eq(posts.id, meet!.postId)).for('update');
    const year = localYear(now, meet!.timeZone);
    const [last] = await tx
      .select({ sequence: max(records.sequence) })
      .from(records)
      .where(and(eq(records.postId, post!.id), eq(records.year, year)));
    const sequence = (last?.sequence ?? 0) + 1;
    const number = `${post!.shortName}-${year}-${String(sequence).padStart(4, '0')}`;

    const content = signedRecord(file, {
      number,
      now,
      staffId: staffId(),
      post: post!,
      meet: meet!,
    });
    if (content.evaluation.missing.length > 0 && !file.check.stoppedEarly) {
      refuseMissing(content.evaluation.missing);
    }
    const text = canonical(content);
    const recordId = uuidv7();
    await tx.insert(records).values({
      id: recordId,
      postId: post!.id,
      year,
      sequence,
      number,
      checkId,
      tagId: file.tag.id,
      meetId: meet!.id,
      verdict: content.evaluation.verdict,
      canonical: text,
      sha256: createHash('sha256').update(text).digest('hex'),
      linkHash: hashToken(linkToken(secret, 'record', recordId, 1)),
      signedAt: now,
    });
    await tx.update(checks).set({ state: 'signed', endedAt: now }).where(eq(checks.id, checkId));
    await saveMove(tx, await lockTag(tx, file.tag.id), { kind: 'sign-off' }, now);
    return {
      result: { recordId, number, verdict: content.evaluation.verdict },
      entry: checkEntry(file, { recordId, number, verdict: content.evaluation.verdict }),
      events: endEvents(file),
    };
  },
});
