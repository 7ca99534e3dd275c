import { v7 as uuidv7 } from 'uuid';
import { testers } from '@/db/schema';
import { testerSchema } from '@/lib/desk/tester';
import { defineCommand } from '@/server/commands/command';
import { postIdOf } from '@/server/commands/staff/shared';
import { refuseTakenName, testerValues } from './shared';

/** Adds a reference torque tester. Until it has a certificate and a proof, it judges nothing. */
export const addTester = defineCommand({
  name: 'tester.add',
  input: testerSchema,
  run: async ({ tx, now, staffId }, input) => {
    await refuseTakenName(tx, input.name);
    const testerId = uuidv7();
    await tx.insert(testers).values({
      id: testerId,
      postId: await postIdOf(tx, staffId()),
      ...testerValues(input),
      createdAt: now,
    });
    return {
      result: { testerId },
      entry: { subjectId: testerId, detail: { ...input } },
      events: [{ kind: 'testers' }],
    };
  },
});
