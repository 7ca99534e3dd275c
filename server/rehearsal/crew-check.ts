import { eq } from 'drizzle-orm';
import { tools } from '@/db/schema';
import { mulberry32, standardNormal } from '@/lib/signal/random';
import { progressOf } from '@/lib/torque/progress';
import type { Actor } from '@/server/access/actor';
import { resumeCheck } from '@/server/commands/check/pause';
import { signOff } from '@/server/commands/check/sign-off';
import { startCheck } from '@/server/commands/check/start';
import { acceptPull } from '@/server/commands/pull/accept';
import { recordPull } from '@/server/commands/pull/record';
import { markUnfit } from '@/server/commands/tag/mark-unfit';
import { toProblemDocument } from '@/server/problem';
import { factsOf } from '@/server/queries/check/facts';
import { loadCheckFile, type CheckFile } from '@/server/queries/check/load';
import { asFoundOf } from './as-found';
import type { Backstage, Bench, OpenTag } from './backstage';
import { makeUpPull, type Behaviour } from './readings';

/** How the tool of a tag behaves: the same at every pull, different from tag to tag. */
function behaviourOf(tagId: string): Behaviour {
  const random = mulberry32(Number.parseInt(tagId.slice(-8), 16));
  const bias = 2 * standardNormal(random);
  return { bias: [1.2 * bias, bias, 0.8 * bias], scatter: 0.2 + 0.4 * random() };
}

/** Starts the check of a tool that lies on the bench; one that cannot be checked is unfit. */
export async function start(
  { stage, run, timing }: Backstage,
  bench: Bench,
  operator: Actor,
  tag: OpenTag,
): Promise<void> {
  if (!timing.isDue('start', tag.id)) return;
  const [row] = await stage.db.select().from(tools).where(eq(tools.id, tag.toolId));
  const { id: _id, createdAt: _createdAt, ...tool } = row!;
  try {
    await run(startCheck, operator, {
      benchId: bench.id,
      tagId: tag.id,
      tool,
      asFound: asFoundOf(tool),
      scheme: tag.consent === 'working' ? 'working' : 'standard',
      workingPoints: tag.consent === 'working' ? tag.workingPoints : null,
      ownerConfirmed: true,
      cautionsSeen: true,
      testerModeConfirmed: true,
    });
  } catch (error) {
    const { code, detail } = toProblemDocument(error);
    if (code !== 'invalid') throw error;
    await run(markUnfit, operator, { tagId: tag.id, reason: detail.slice(0, 300) });
  }
}

async function pull(
  { run, random }: Backstage,
  operator: Actor,
  file: CheckFile,
  index: number,
  tagId: string,
) {
  const { plan, id: checkId } = file.check;
  const step = plan.steps[index]!;
  const reading = step.kind === 'reading';
  const { valueNm, toolValue } = makeUpPull(
    plan,
    step,
    {
      behaviour: behaviourOf(tagId),
      division: file.tool.unit === plan.unit ? file.tool.division : null,
      testerStepNm: file.tester.resolutionNm,
    },
    random,
  );
  await run(recordPull, operator, {
    checkId,
    value: reading ? valueNm : null,
    unit: 'N.m',
    direction: step.direction,
    toolValue: reading ? toolValue : null,
    confirmed: true,
  });
}

/** The next thing to do in a running check: one pull, or the sign-off. */
export async function goOn(
  scene: Backstage,
  operator: Actor,
  checkId: string,
  tag: OpenTag,
): Promise<void> {
  const { stage, timing, run } = scene;
  const file = await loadCheckFile(stage.db, { checkId });
  if (!file) return;
  const { nextStepIndex, missing } = progressOf(factsOf(file));
  const offered = file.pulls.find(({ accepted, voided }) => !accepted && !voided);
  if (offered) {
    if (!timing.isDue('pull', checkId)) return;
    const { target } = file.check.plan.steps[offered.pull.stepIndex]!;
    const toolValue = file.check.plan.setting ? null : target;
    await run(acceptPull, operator, { pullId: offered.pull.id, toolValue, confirmed: true });
  } else if (file.check.stoppedEarly || missing.length === 0 || nextStepIndex === null) {
    if (timing.isDue('signOff', checkId)) await run(signOff, operator, { checkId });
  } else if (timing.isDue('pull', checkId)) {
    if (file.check.pausedAt) await run(resumeCheck, operator, { checkId });
    else await pull(scene, operator, file, nextStepIndex, tag.id);
  }
}
