import type { Actor } from '@/server/access/actor';
import type { CommandContext } from '@/server/commands/command';
import { FIRST_COMMAND, fixedId } from './ids';

/** What the rehearsal plays on: everything that a command is handed, but for who runs it. */
export type Stage = Omit<CommandContext, 'actor'>;

type AnyCommand<Input, Result> = (ctx: CommandContext, id: string, input: Input) => Promise<Result>;

/** Runs a command as somebody. */
export type Run = <Input, Result>(
  command: AnyCommand<Input, Result>,
  actor: Actor,
  input: Input,
) => Promise<Result>;

/** Lets timers and sockets have their turn: awaited queries alone would starve them. */
export const breathe = (): Promise<void> => new Promise((resolve) => setImmediate(resolve));

/** Runs commands on a stage, each with the id that `nextId` gives. */
export function runner(stage: Stage, nextId: () => string): Run {
  return async (command, actor, input) => {
    await breathe();
    return command({ ...stage, actor }, nextId(), input);
  };
}

/** The fixed ids of the story's commands, one after the other. */
export function fixedIds(): () => string {
  let last = FIRST_COMMAND;
  return () => fixedId((last += 1));
}
