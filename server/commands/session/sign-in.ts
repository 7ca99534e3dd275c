import { eq } from 'drizzle-orm';
import { z } from 'zod';
import { staff } from '@/db/schema';
import { defineCommand } from '@/server/commands/command';
import { Problem } from '@/server/problem';

/**
 * Records that somebody signed in. The edge has verified the password; whether the person may still
 * come in is read again here. Never open to the wire: only the sign-in page calls it.
 */
export const signIn = defineCommand({
  name: 'session.sign-in',
  input: z.object({ staffId: z.uuid() }),
  run: async ({ tx }, { staffId }) => {
    const [person] = await tx.select().from(staff).where(eq(staff.id, staffId));
    if (!person?.active) throw new Problem('forbidden', 'This account is switched off.');
    return {
      result: { staffId, sessionVersion: person.sessionVersion, role: person.role },
      entry: { subjectId: staffId },
    };
  },
});
