import type { Database } from '@/db/client';
import type { Actor } from '@/server/access/actor';
import { takeBench } from '@/server/commands/bench/take';
import { pauseBench, openBench } from '@/server/commands/bench/set-state';
import { addNote } from '@/server/commands/check/note';
import { pauseCheck, resumeCheck } from '@/server/commands/check/pause';
import { signOff } from '@/server/commands/check/sign-off';
import { startCheck } from '@/server/commands/check/start';
import type { CommandContext } from '@/server/commands/command';
import { acceptPull } from '@/server/commands/pull/accept';
import { recordPull } from '@/server/commands/pull/record';
import { voidPull } from '@/server/commands/pull/void';
import { callTag } from '@/server/commands/tag/call';
import { handBack } from '@/server/commands/tag/hand-back';
import { hangTool } from '@/server/commands/tag/hang';
import { holdTag } from '@/server/commands/tag/hold';
import { joinLine } from '@/server/commands/tag/join';
import { markAway } from '@/server/commands/tag/mark-away';
import { moveInLine } from '@/server/commands/tag/move';
import { releaseTag } from '@/server/commands/tag/release';
import { returnToLine } from '@/server/commands/tag/return-to-line';
import { takeOnBench } from '@/server/commands/tag/take-on-bench';
import { withdrawTag } from '@/server/commands/tag/withdraw';
import { PLATE, startInput } from '../../support/line';
import type { World } from './fill';
import { pullFor, stepsOf } from '../one-check';

type AnyCommand<Input, Result> = {
  (ctx: CommandContext, id: string, input: Input): Promise<Result>;
  readonly commandName: string;
};

/** Runs a command as somebody, and keeps the statements that it took under its name. */
export type Play = <Input, Result>(
  command: AnyCommand<Input, Result>,
  actor: Actor,
  input: Input,
) => Promise<Result>;

export interface Cast {
  operator: Actor;
  lead: Actor;
  tester: Actor;
}

const PUBLIC: Actor = { kind: 'public' };

/** A visitor joins; another one does so and goes again. */
export async function join(play: Play, world: World): Promise<string> {
  const input = {
    meetId: world.meet.id,
    tool: PLATE,
    consent: 'maximum' as const,
    visitor: { name: 'Vera Quill', email: 'vera@example.org' },
  };
  const gone = await play(joinLine, PUBLIC, input);
  await play(withdrawTag, { kind: 'visitor', tagId: gone.tagId }, { tagId: gone.tagId });
  return (await play(joinLine, PUBLIC, input)).tagId;
}

/** The next tag is called, does not come, comes back, is moved and held, and lies on the bench. */
export async function callAndTake(play: Play, world: World, cast: Cast): Promise<string> {
  const { operator, lead } = cast;
  const benchId = world.bench.id;
  await play(takeBench, operator, { benchId });
  await play(pauseBench, operator, { benchId, reason: 'Tea' });
  await play(openBench, operator, { benchId });
  const { tagId } = await play(callTag, operator, { benchId });
  await play(markAway, operator, { tagId });
  await play(returnToLine, operator, { tagId });
  await play(moveInLine, lead, { tagId, place: 1, reason: 'It was its turn.' });
  await play(holdTag, lead, { tagId, minutes: 10 });
  await play(releaseTag, lead, { tagId });
  await play(callTag, operator, { benchId, tagId });
  await play(takeOnBench, operator, { benchId, tagId });
  return tagId;
}

/**
 * The check runs to its last pull. One reading comes from the tester and is accepted, one is voided
 * and taken anew; `halfway` runs once there are readings.
 */
export async function check(
  play: Play,
  { world, db, cast, tagId }: { world: World; db: Database; cast: Cast; tagId: string },
  halfway: () => Promise<void> = async () => undefined,
): Promise<string> {
  const { operator, tester } = cast;
  const { checkId } = await play(startCheck, operator, startInput(world.bench.id, tagId));
  const steps = await stepsOf(db, checkId);
  const [offered, voided, ...rest] = steps.filter(({ kind }) => kind === 'reading');
  for (const step of steps.filter(({ kind }) => kind === 'exercise')) {
    await play(recordPull, operator, pullFor(checkId, step));
  }
  const { pullId } = await play(recordPull, tester, pullFor(checkId, offered!));
  await play(acceptPull, operator, { pullId });
  const slipped = await play(recordPull, operator, pullFor(checkId, voided!));
  await play(voidPull, operator, { pullId: slipped.pullId, fault: 'slipped' });
  await play(recordPull, operator, pullFor(checkId, voided!));
  await play(pauseCheck, operator, { checkId });
  await play(resumeCheck, operator, { checkId });
  await play(addNote, operator, { checkId, text: 'The grip is worn.' });
  await halfway();
  for (const step of rest) await play(recordPull, operator, pullFor(checkId, step));
  return checkId;
}

/** The check is signed off, and the tool goes home by way of a peg. */
export async function finish(
  play: Play,
  { cast, checkId, tag }: { cast: Cast; checkId: string; tag: { id: string; code: string } },
): Promise<string> {
  const { recordId } = await play(signOff, cast.operator, { checkId });
  await play(hangTool, cast.operator, { tagId: tag.id });
  await play(handBack, cast.operator, { tagId: tag.id, ticketCode: tag.code });
  return recordId;
}
