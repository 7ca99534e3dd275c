import { v7 as uuidv7 } from 'uuid';
import { z } from 'zod';
import { checkNotes } from '@/db/schema';
import { defineCommand } from '@/server/commands/command';
import { checkEntry, checkInput, lockCheck } from './shared';

/** A remark that stands on the record. */
export const addNote = defineCommand({
  name: 'check.note',
  input: checkInput.extend({
    text: z
      .string()
      .trim()
      .min(1, 'Write something, or close the note.')
      .max(500, 'A note can have at most 500 characters.'),
  }),
  run: async ({ tx, now, staffId }, { checkId, text }) => {
    const file = await lockCheck(tx, checkId);
    const id = uuidv7();
    await tx.insert(checkNotes).values({ id, checkId, text, at: now, byStaffId: staffId() });
    return {
      result: { noteId: id },
      entry: checkEntry(file, { noteId: id }),
      events: [{ kind: 'check', file: { ...file, notes: [{ text, at: now }, ...file.notes] } }],
    };
  },
});
