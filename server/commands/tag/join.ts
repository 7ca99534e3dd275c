import { eq, sql } from 'drizzle-orm';
import { v7 as uuidv7 } from 'uuid';
import { meets, tags, tools, visitors } from '@/db/schema';
import { tagCode, TAGS_PER_MEET } from '@/lib/line/code';
import { joinSchema } from '@/lib/line/join';
import { hashToken, linkToken } from '@/server/access/links';
import { defineCommand } from '@/server/commands/command';
import { Problem } from '@/server/problem';
import { tagEntry } from './shared';

/**
 * Joins the line with one tool: a tag at its end, and a ticket for the phone. The result holds ids
 * only; the ticket's address is made from them again whenever it is needed.
 */
export const joinLine = defineCommand({
  name: 'tag.join',
  input: joinSchema,
  run: async ({ tx, now, secret, standing }, input) => {
    // The counter also takes the meet's row, so that no code and no place is given out twice.
    const [meet] = await tx
      .update(meets)
      .set({ tagsIssued: sql`${meets.tagsIssued} + 1` })
      .where(eq(meets.id, input.meetId))
      .returning();
    if (!meet) throw new Problem('not-found', 'There is no such meet.');
    if (!meet.joinOpen && standing === 'public') {
      throw new Problem('wrong-move', 'The line is closed to new tools just now. Ask at the post.');
    }
    if (meet.tagsIssued > TAGS_PER_MEET) {
      throw new Problem('wrong-move', 'This meet has given out all its codes. Ask at the post.');
    }

    const visitorId = await visitorOf(input.otherTicket);
    async function visitorOf(ticket: string | null): Promise<string> {
      if (ticket !== null) {
        const [other] = await tx
          .select({ visitorId: tags.visitorId })
          .from(tags)
          .where(eq(tags.ticketHash, hashToken(ticket)));
        if (!other) throw new Problem('not-found', 'There is no such ticket.');
        return other.visitorId;
      }
      const id = uuidv7();
      await tx.insert(visitors).values({ id, ...input.visitor, createdAt: now });
      return id;
    }

    const toolId = uuidv7();
    await tx.insert(tools).values({ id: toolId, ...input.tool, createdAt: now });
    const tagId = uuidv7();
    const [tag] = await tx
      .insert(tags)
      .values({
        id: tagId,
        meetId: meet.id,
        code: tagCode(meet.tagsIssued),
        toolId,
        visitorId,
        state: 'waiting',
        place: 'visitor',
        position: meet.tagsIssued,
        consent: input.consent,
        workingPoints: input.workingPoints,
        ticketHash: hashToken(linkToken(secret, 'ticket', tagId, 1)),
        joinedAt: now,
      })
      .returning();
    return {
      result: { tagId, code: tag!.code },
      entry: tagEntry(tag!, { toolId, consent: input.consent }),
      events: [{ kind: 'line', meetId: meet.id }],
    };
  },
});
