import type { Actor } from '@/server/access/actor';
import type { CommandContext } from '@/server/commands/command';

/** What the rehearsal plays on: everything that a command is handed, but for who runs it. */
export type Stage = Omit<CommandContext, 'actor'>;

export const as = (stage: Stage, actor: Actor): CommandContext => ({ ...stage, actor });

/** A member of staff as a command knows them; nobody of the rehearsal was ever signed out. */
export const staffActor = (staffId: string): Actor => ({
  kind: 'staff',
  staffId,
  sessionVersion: 1,
});

/** Lets timers and sockets have their turn: awaited queries alone would starve them. */
export const breathe = (): Promise<void> => new Promise((resolve) => setImmediate(resolve));
