import { v7 as uuidv7 } from 'uuid';
import { mulberry32 } from '@/lib/signal/random';
import { commandContext, type Runtime } from '@/server/runtime';
import { toProblemDocument } from '@/server/problem';
import { look, type Backstage } from './backstage';
import { crewActs } from './crew';
import { STEP_MS } from './pace';
import { settingOf } from './setting';
import { runner, type Stage } from './stage';
import { createTiming } from './timing';
import { visitorsAct } from './visitors';

const SEED = 47_110;

/** Everything that a run of simulated visitors knows. Whoever is there already counts as one. */
export async function backstageOf(stage: Stage): Promise<Backstage> {
  const random = mulberry32(SEED);
  const scene: Backstage = {
    stage,
    run: runner(stage, uuidv7),
    setting: await settingOf(stage.db),
    random,
    timing: createTiming(stage.clock, random),
    own: new Set(),
    stayedAway: new Set(),
  };
  for (const { id, state } of (await look(scene)).open) {
    scene.own.add(id);
    if (state === 'away') scene.stayedAway.add(id);
  }
  return scene;
}

/** One look at the meet, and what visitors and crew do about it. */
export async function step(scene: Backstage): Promise<void> {
  await visitorsAct(scene, (await look(scene)).open);
  await crewActs(scene, await look(scene));
}

/** Lets simulated visitors come and go until `stop`, which waits for the step under way. */
export async function startVisitors(runtime: Runtime): Promise<{ stop(): Promise<void> }> {
  const { actor: _actor, ...stage } = commandContext({ kind: 'public' }, runtime);
  const scene = await backstageOf(stage);
  let stopped = false;
  let timer: NodeJS.Timeout | undefined;
  let underWay = Promise.resolve();

  const tell = (error: unknown): void => {
    const { code, detail } = toProblemDocument(error);
    // A person was faster, or has closed the line: the next look shows it.
    if (code === 'internal') runtime.logger.error({ err: error }, 'a simulated visitor stumbled');
    else runtime.logger.debug({ code, detail }, 'a simulated visitor was refused');
  };
  const next = (): void => {
    timer = setTimeout(() => {
      underWay = step(scene)
        .catch(tell)
        .then(() => (stopped ? undefined : next()));
    }, STEP_MS);
  };
  next();
  return {
    async stop() {
      stopped = true;
      clearTimeout(timer);
      await underWay;
    },
  };
}
