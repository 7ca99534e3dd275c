import { z } from 'zod';
import { parseTagCode } from '@/lib/line/code';
import { defineCommand } from '@/server/commands/command';
import { Problem } from '@/server/problem';
import { lockTag, saveMove, tagEntry, tagEvents, tagInput } from './shared';

/**
 * The tool goes home. The operator types the code on the visitor's ticket; it must be the code of
 * the tool in hand, or nothing happens.
 */
export const handBack = defineCommand({
  name: 'tag.hand-back',
  input: tagInput.extend({
    ticketCode: z.string().trim().min(1, 'Type the code on the ticket.').max(10),
  }),
  run: async ({ tx, now }, { tagId, ticketCode }) => {
    const tag = await lockTag(tx, tagId);
    const code = parseTagCode(ticketCode);
    if (code === null) {
      throw new Problem('invalid', 'A code is a letter and two digits, such as A27.', {
        fields: { ticketCode: 'A code is a letter and two digits, such as A27.' },
      });
    }
    if (code !== tag.code) {
      const words = `Stop: the ticket says ${code}, this tool is ${tag.code}. Do not hand it over.`;
      throw new Problem('conflict', words, { fields: { ticketCode: words } });
    }
    const moved = await saveMove(tx, tag, { kind: 'hand-back' }, now);
    return {
      result: { tagId, state: moved.state },
      entry: tagEntry(moved),
      events: tagEvents(moved, tag.benchId),
    };
  },
});
