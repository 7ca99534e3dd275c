import { and, eq } from 'drizzle-orm';
import { checks } from '@/db/schema';
import { nextTag } from '@/lib/line/order';
import type { Actor } from '@/server/access/actor';
import { callTag } from '@/server/commands/tag/call';
import { handBack } from '@/server/commands/tag/hand-back';
import { hangTool } from '@/server/commands/tag/hang';
import { markAway } from '@/server/commands/tag/mark-away';
import { takeOnBench } from '@/server/commands/tag/take-on-bench';
import type { Backstage, Bench, OpenTag } from './backstage';
import { goOn, start } from './crew-check';
import { ABSENT_ONE_IN, PEG_SHARE } from './pace';

const staysAway = ({ own, stayedAway }: Backstage, { id, code }: OpenTag): boolean =>
  own.has(id) && !stayedAway.has(id) && Number(code.slice(1)) % ABSENT_ONE_IN === 0;

async function waitFor(scene: Backstage, bench: Bench, operator: Actor, tag: OpenTag) {
  const { timing, run, stayedAway } = scene;
  if (staysAway(scene, tag)) {
    if (!timing.isDue('givenUp', tag.id)) return;
    await run(markAway, operator, { tagId: tag.id });
    stayedAway.add(tag.id);
  } else if (timing.isDue('come', tag.id)) {
    await run(takeOnBench, operator, { tagId: tag.id, benchId: bench.id });
  }
}

async function handOver(
  { timing, run, random, own, stayedAway }: Backstage,
  operator: Actor,
  tag: OpenTag,
) {
  if (!timing.isDue('handOver', tag.id)) return;
  if (tag.state === 'ready' && random() < PEG_SHARE) {
    await run(hangTool, operator, { tagId: tag.id });
    return;
  }
  await run(handBack, operator, { tagId: tag.id, ticketCode: tag.code });
  own.delete(tag.id);
  stayedAway.delete(tag.id);
}

async function workAt(scene: Backstage, bench: Bench, operator: Actor, open: readonly OpenTag[]) {
  const { stage, timing, run } = scene;
  const tag = open.find(({ benchId }) => benchId === bench.id);
  if (!tag) {
    const next = nextTag(open, stage.clock());
    if (next && timing.isDue('call', bench.id)) {
      await run(callTag, operator, { benchId: bench.id, tagId: null });
    }
    return;
  }
  if (tag.state === 'called') return waitFor(scene, bench, operator, tag);
  if (tag.state !== 'on_bench') return handOver(scene, operator, tag);
  const [running] = await stage.db
    .select({ id: checks.id })
    .from(checks)
    .where(and(eq(checks.benchId, bench.id), eq(checks.state, 'running')));
  if (running) await goOn(scene, operator, running.id, tag);
  else await start(scene, bench, operator, tag);
}

/**
 * Works at every open bench that nobody has taken, and gives out tools that hang on pegs. Never
 * takes a bench: as soon as a person does, that bench is theirs.
 */
export async function crewActs(
  scene: Backstage,
  { open, benches }: { open: readonly OpenTag[]; benches: readonly Bench[] },
): Promise<void> {
  const free = benches.filter(({ operatorId, state }) => operatorId === null && state === 'open');
  for (const bench of free) {
    await workAt(
      scene,
      bench,
      scene.setting.crew[(bench.number - 1) % scene.setting.crew.length]!,
      open,
    );
  }
  if (free.length === 0) return;
  for (const tag of open) {
    const done = tag.state === 'ready' || tag.state === 'unfit' || tag.state === 'withdrawn';
    if (done && tag.place === 'peg' && scene.timing.isDue('collect', tag.id)) {
      await scene.run(handBack, scene.setting.crew[0]!, { tagId: tag.id, ticketCode: tag.code });
    }
  }
}
