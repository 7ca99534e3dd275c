import { addNote } from '@/server/commands/check/note';
import { signOff } from '@/server/commands/check/sign-off';
import { startCheck } from '@/server/commands/check/start';
import { stopEarly } from '@/server/commands/check/stop-early';
import { acceptPull } from '@/server/commands/pull/accept';
import { recordPull } from '@/server/commands/pull/record';
import { voidPull } from '@/server/commands/pull/void';
import { loadCheckFile, type CheckFile } from '@/server/queries/check/load';
import type { Actor } from '@/server/access/actor';
import { asFoundOf } from './as-found';
import { CAST, type Name, type Part } from './cast';
import { makeUpPull } from './readings';
import { later, tagOf, type Telling } from './told';
import { TOOLS } from './tools';
import type { CheckTold } from './turns';

const SECONDS_A_PULL = 14;

interface Place {
  benchId: string;
  operator: Actor;
}

type Scene = AsyncGenerator<Date, void, void>;

/** One pull: offered by the tester and accepted, or typed, as the tester of the bench has it. */
async function pullOnce(
  telling: Telling,
  file: CheckFile,
  stepIndex: number,
  operator: Actor,
  told: CheckTold,
): Promise<string> {
  const { check, tester, tool } = file;
  const step = check.plan.steps[stepIndex]!;
  const { valueNm, toolValue } = makeUpPull(
    check.plan,
    step,
    { behaviour: told.behaviour, division: tool.division, testerStepNm: tester.resolutionNm },
    telling.random,
  );
  const reading = step.kind === 'reading';
  const pull = { checkId: check.id, unit: 'N.m' as const, direction: step.direction };
  if (tester.connection.kind === 'keyed') {
    const { pullId } = await telling.run(recordPull, operator, {
      ...pull,
      value: reading ? valueNm : null,
      toolValue: reading ? toolValue : null,
    });
    return pullId;
  }
  const fromTester = { kind: 'tester' as const, testerId: tester.id };
  const { pullId } = await telling.run(recordPull, fromTester, { ...pull, value: valueNm });
  if (reading) await telling.run(acceptPull, operator, { pullId, toolValue });
  return pullId;
}

/** A whole check of a tool that lies on the bench, from its start to sign-off or to where it is left. */
export async function* checkScene(
  telling: Telling,
  { benchId, operator }: Place,
  who: Name,
  told: CheckTold,
): Scene {
  const part: Part = CAST[who];
  const tool = TOOLS[part.tool];
  const { checkId } = await telling.run(startCheck, operator, {
    benchId,
    tagId: tagOf(telling, who).tagId,
    tool,
    asFound: asFoundOf(tool, told),
    scheme: told.scheme ?? 'standard',
    workingPoints: part.workingPoints ? [...part.workingPoints] : null,
    ownerConfirmed: true,
    cautionsSeen: true,
    testerModeConfirmed: true,
  });
  const file = (await loadCheckFile(telling.stage.db, { checkId }))!;
  const steps = file.check.plan.steps.length;
  const last = Math.min(told.half ?? steps, told.stopped?.after ?? steps, steps);
  for (let index = 0; index < last; index += 1) {
    yield later(telling, SECONDS_A_PULL);
    const pullId = await pullOnce(telling, file, index, operator, told);
    if (told.voided?.pull === index + 1) {
      yield later(telling, SECONDS_A_PULL);
      const { fault, note } = told.voided;
      await telling.run(voidPull, operator, { pullId, fault, note });
      await pullOnce(telling, file, index, operator, told);
    }
  }
  if (told.half !== undefined) return;
  yield later(telling, 2 * SECONDS_A_PULL);
  if (told.note) await telling.run(addNote, operator, { checkId, text: told.note });
  if (told.stopped) {
    await telling.run(stopEarly, operator, { checkId, reason: told.stopped.reason });
  }
  await telling.run(signOff, operator, { checkId });
}
