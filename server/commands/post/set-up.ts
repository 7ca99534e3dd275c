import { sql } from 'drizzle-orm';
import { v7 as uuidv7 } from 'uuid';
import { posts, staff } from '@/db/schema';
import { setUpSchema } from '@/lib/desk/set-up';
import { defineCommand } from '@/server/commands/command';
import { insertMeet } from '@/server/commands/meet/shared';
import { Problem } from '@/server/problem';

/**
 * Makes the post, its owner and its first meet, once. The edge has checked the set-up code and
 * hashed the password; that nobody was faster is decided here, in the same transaction.
 */
export const setUpPost = defineCommand({
  name: 'post.set-up',
  input: setUpSchema,
  run: async ({ tx, now }, input) => {
    await tx.execute(sql`lock table ${staff} in exclusive mode`);
    const [anybody] = await tx.select({ id: staff.id }).from(staff).limit(1);
    if (anybody) throw new Problem('wrong-move', 'This post has been set up already. Sign in.');

    const postId = uuidv7();
    await tx.insert(posts).values({ id: postId, ...input.post, createdAt: now });
    const staffId = uuidv7();
    await tx
      .insert(staff)
      .values({ id: staffId, postId, ...input.owner, role: 'owner', createdAt: now });
    const meet = await insertMeet(tx, { postId, ...input.meet }, now);
    return {
      result: { postId, staffId, sessionVersion: 1, meetId: meet.id },
      entry: {
        meetId: meet.id,
        subjectId: postId,
        detail: { staffId, benches: input.meet.benches },
      },
      events: [{ kind: 'line', meetId: meet.id }],
    };
  },
});
