import { leaveBench } from '@/server/commands/bench/leave';
import { takeBench } from '@/server/commands/bench/take';
import { callTag } from '@/server/commands/tag/call';
import { handBack } from '@/server/commands/tag/hand-back';
import { hangTool } from '@/server/commands/tag/hang';
import { markAway } from '@/server/commands/tag/mark-away';
import { markUnfit } from '@/server/commands/tag/mark-unfit';
import { takeOnBench } from '@/server/commands/tag/take-on-bench';
import { CREW } from './accounts';
import { checkScene } from './check-script';
import type { Script } from './director';
import { BENCH_IDS } from './ids';
import { staffActor } from './stage';
import { tagOf, type Telling } from './told';
import { TURNS, type Turn } from './turns';

async function* turnScript(telling: Telling, bench: number, { who, at, told }: Turn): Script {
  const benchId = BENCH_IDS[bench]!;
  const operator = staffActor(CREW[bench]!.id);
  const { tagId, code } = tagOf(telling, who);
  await telling.run(callTag, operator, { benchId, tagId });
  if (told.kind === 'called') return;

  yield telling.ago(at - 1.5);
  if (told.kind === 'away') {
    yield telling.ago(at - 6);
    await telling.run(markAway, operator, { tagId });
    return;
  }
  await telling.run(takeOnBench, operator, { tagId, benchId });
  yield telling.ago(at - 2.5);
  if (told.kind === 'unfit') {
    await telling.run(markUnfit, operator, { tagId, reason: told.reason });
    await telling.run(hangTool, operator, { tagId });
    return;
  }
  yield* checkScene(telling, { benchId, operator }, who, told);
  if (told.half !== undefined) return;

  const then = told.then ?? 'returned';
  yield new Date(telling.stage.clock().getTime() + 60_000);
  if (then !== 'returned') await telling.run(hangTool, operator, { tagId });
  if (then === 'peg') return;
  if (then === 'peg, then returned') yield new Date(telling.stage.clock().getTime() + 300_000);
  await telling.run(handBack, operator, { tagId, ticketCode: code });
}

async function* benchScript(telling: Telling, bench: number, turns: readonly Turn[]): Script {
  const benchId = BENCH_IDS[bench]!;
  const operator = staffActor(CREW[bench]!.id);
  yield telling.ago(turns[0]!.at + 2);
  await telling.run(takeBench, operator, { benchId });
  for (const turn of turns) {
    yield telling.ago(turn.at);
    yield* turnScript(telling, bench, turn);
  }
  await telling.run(leaveBench, operator, { benchId });
}

/** What happens at each bench, each in a script of its own. */
export const benchScripts = (telling: Telling): Script[] =>
  TURNS.map((turns, bench) => benchScript(telling, bench, turns));
