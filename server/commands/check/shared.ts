import { z } from 'zod';
import type { Transaction } from '@/db/client';
import type { LiveEvent } from '@/server/live/events';
import { Problem } from '@/server/problem';
import { loadCheckFile, type CheckFile } from '@/server/queries/check/load';

export const checkInput = z.object({ checkId: z.uuid() });

/** The running check, its row taken for the transaction. @throws Problem `not-found`, `wrong-move`. */
export async function lockCheck(tx: Transaction, checkId: string): Promise<CheckFile> {
  const file = await loadCheckFile(tx, { checkId }, { lock: true });
  if (!file) throw new Problem('not-found', 'There is no such check.');
  return running(file);
}

/** @throws Problem `wrong-move` when the check has ended. */
export function running(file: CheckFile): CheckFile {
  if (file.check.state !== 'running') {
    throw new Problem(
      'wrong-move',
      `This check of ${file.tag.code} is ${file.check.state} already.`,
    );
  }
  return file;
}

export const checkEntry = (file: CheckFile, detail: Record<string, unknown> = {}) => ({
  meetId: file.check.meetId,
  subjectId: file.check.id,
  detail: { tagId: file.tag.id, code: file.tag.code, ...detail },
});

/** A check came to its end: bench, board, phone and desk read anew. */
export const endEvents = (file: CheckFile): LiveEvent[] => [
  { kind: 'check-ended', benchId: file.check.benchId },
  { kind: 'bench', benchId: file.check.benchId },
  { kind: 'line', meetId: file.check.meetId },
  { kind: 'tag', tagId: file.tag.id },
];
