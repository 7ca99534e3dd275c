import { v7 as uuidv7 } from 'uuid';
import { staff } from '@/db/schema';
import { passwordHashSchema, personSchema } from '@/lib/desk/staff';
import { defineCommand } from '@/server/commands/command';
import { postIdOf, refuseTakenLogin } from './shared';

/** Adds a person who can sign in. */
export const addStaff = defineCommand({
  name: 'staff.add',
  input: personSchema.extend({ passwordHash: passwordHashSchema }),
  run: async ({ tx, now, staffId: me }, input) => {
    await refuseTakenLogin(tx, input.login);
    const staffId = uuidv7();
    await tx
      .insert(staff)
      .values({ id: staffId, postId: await postIdOf(tx, me()), ...input, createdAt: now });
    return { result: { staffId }, entry: { subjectId: staffId, detail: { role: input.role } } };
  },
});
