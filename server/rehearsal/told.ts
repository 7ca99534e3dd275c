import type { Actor } from '@/server/access/actor';
import type { CommandContext } from '@/server/commands/command';
import type { RandomSource } from '@/lib/signal/random';
import type { Name } from './cast';
import { FIRST_COMMAND, fixedId } from './ids';
import { as, breathe, type Stage } from './stage';

type StoryCommand<Input, Result> = (
  ctx: CommandContext,
  id: string,
  input: Input,
) => Promise<Result>;

/** What the scripts of the story share. */
export interface Telling {
  stage: Stage;
  random: RandomSource;
  /** The tags that have joined so far. */
  tags: Map<Name, { tagId: string; code: string }>;
  /** The instant so many minutes before the rehearsal opened. */
  ago(minutes: number): Date;
  /** Runs a command as somebody, with the next fixed id. */
  run<Input, Result>(
    command: StoryCommand<Input, Result>,
    actor: Actor,
    input: Input,
  ): Promise<Result>;
}

/** @throws Error when the story calls a tag before it has joined. */
export function tagOf(telling: Telling, who: Name): { tagId: string; code: string } {
  const tag = telling.tags.get(who);
  if (!tag) throw new Error(`The story calls '${who}' before that tag has joined.`);
  return tag;
}

export function telling(stage: Stage, random: RandomSource, opened: Date): Telling {
  let commands = FIRST_COMMAND;
  return {
    stage,
    random,
    tags: new Map(),
    ago: (minutes) => new Date(opened.getTime() - minutes * 60_000),
    async run(command, actor, input) {
      await breathe();
      commands += 1;
      return command(as(stage, actor), fixedId(commands), input);
    },
  };
}
