'use server';

import { v7 as uuidv7 } from 'uuid';
import { z } from 'zod';
import type { ActionAnswer } from '@/components/desk/admin/person-forms';
import { newPasswordSchema, newPersonSchema } from '@/lib/desk/staff';
import { currentActor, requireStaff, staffSession } from '@/server/access/current';
import { hashPassword } from '@/server/access/password';
import { addStaff } from '@/server/commands/staff/add';
import { setPassword } from '@/server/commands/staff/set-password';
import { problemOf } from '@/server/edge';
import { Problem } from '@/server/problem';
import { commandContext } from '@/server/runtime';

/** @throws Problem `invalid`: the command would say the same, but it must not see the password. */
function parsed<Schema extends z.ZodType>(schema: Schema, input: unknown): z.output<Schema> {
  const result = schema.safeParse(input);
  if (result.success) return result.data;
  const fields: Record<string, string> = {};
  for (const issue of result.error.issues) fields[issue.path.join('.')] ??= issue.message;
  throw new Problem('invalid', Object.values(fields).join(' '), { fields });
}

async function answer<Result>(run: () => Promise<Result>): Promise<ActionAnswer<Result>> {
  try {
    return { result: await run() };
  } catch (error) {
    return { problem: problemOf(error) };
  }
}

/** Hashes the password and adds the person. */
export async function addPerson(input: unknown): Promise<ActionAnswer<{ staffId: string }>> {
  return answer(async () => {
    // Before the hash: it costs time that only an owner may spend.
    await requireStaff('staff.add');
    const { password, ...person } = parsed(newPersonSchema, input);
    const passwordHash = await hashPassword(password);
    return addStaff(commandContext(await currentActor()), uuidv7(), { ...person, passwordHash });
  });
}

/** Hashes the password and gives it to the person. The owner's own session here goes on. */
export async function changePassword(input: unknown): Promise<ActionAnswer<{ staffId: string }>> {
  return answer(async () => {
    const me = await requireStaff('staff.set-password');
    const { password, staffId } = parsed(newPasswordSchema, input);
    const passwordHash = await hashPassword(password);
    const context = commandContext(await currentActor());
    const changed = await setPassword(context, uuidv7(), { staffId, passwordHash });
    if (staffId === me.id) {
      const session = await staffSession();
      session.sessionVersion = changed.sessionVersion;
      await session.save();
    }
    return { staffId };
  });
}
