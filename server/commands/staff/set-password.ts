import { eq } from 'drizzle-orm';
import { z } from 'zod';
import { staff } from '@/db/schema';
import { passwordHashSchema } from '@/lib/desk/staff';
import { defineCommand } from '@/server/commands/command';
import { lockStaff, staffEvents } from './shared';

/** Gives a person a new password. Every session of theirs ends. */
export const setPassword = defineCommand({
  name: 'staff.set-password',
  input: z.object({ staffId: z.uuid(), passwordHash: passwordHashSchema }),
  run: async ({ tx }, { staffId, passwordHash }) => {
    const { person } = await lockStaff(tx, staffId);
    const sessionVersion = person.sessionVersion + 1;
    await tx.update(staff).set({ passwordHash, sessionVersion }).where(eq(staff.id, staffId));
    return {
      result: { staffId, sessionVersion },
      entry: { subjectId: staffId },
      events: staffEvents(staffId),
    };
  },
});
