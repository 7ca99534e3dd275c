import { z } from 'zod';
import { defineCommand } from '@/server/commands/command';
import { staffEvents } from '@/server/commands/staff/shared';

/** Records that somebody signed out here. Their live connections end; other devices come back. */
export const signOut = defineCommand({
  name: 'session.sign-out',
  input: z.object({}),
  run: async ({ staffId }) => {
    const id = staffId();
    return { result: { staffId: id }, entry: { subjectId: id }, events: staffEvents(id) };
  },
});
