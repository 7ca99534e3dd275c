import { eq } from 'drizzle-orm';
import { benches, staff } from '@/db/schema';
import { changeStaffSchema, leavesAnOwner } from '@/lib/desk/staff';
import { defineCommand } from '@/server/commands/command';
import type { LiveEvent } from '@/server/live/events';
import { Problem } from '@/server/problem';
import { lockStaff, staffEvents } from './shared';

/**
 * Changes a person's name or role, or switches the account off or on. Sessions of an account that
 * is switched off end for good; a benched operator leaves the bench.
 */
export const changeStaff = defineCommand({
  name: 'staff.change',
  input: changeStaffSchema,
  run: async ({ tx }, input) => {
    const { person, everybody } = await lockStaff(tx, input.staffId);
    const { name = person.name, role = person.role, active = person.active } = input;
    if (!leavesAnOwner(everybody, { id: person.id, role, active })) {
      throw new Problem(
        'wrong-move',
        `${person.name} is the last owner who can sign in. Make somebody else an owner first.`,
      );
    }
    const ended = person.active && !active;
    const sessionVersion = person.sessionVersion + (ended ? 1 : 0);
    await tx
      .update(staff)
      .set({ name, role, active, sessionVersion })
      .where(eq(staff.id, person.id));
    const left = ended
      ? await tx
          .update(benches)
          .set({ operatorId: null })
          .where(eq(benches.operatorId, person.id))
          .returning({ benchId: benches.id, meetId: benches.meetId })
      : [];
    const events: LiveEvent[] = staffEvents(person.id);
    for (const { benchId, meetId } of left) {
      events.push({ kind: 'line', meetId }, { kind: 'bench', benchId });
    }
    return {
      result: { staffId: person.id, role, active },
      entry: { subjectId: person.id, detail: { role, active, renamed: name !== person.name } },
      events,
    };
  },
});
