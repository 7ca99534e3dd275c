import { leaveBench } from '@/server/commands/bench/leave';
import { takeBench } from '@/server/commands/bench/take';
import { callTag } from '@/server/commands/tag/call';
import { handBack } from '@/server/commands/tag/hand-back';
import { hangTool } from '@/server/commands/tag/hang';
import { markAway } from '@/server/commands/tag/mark-away';
import { markUnfit } from '@/server/commands/tag/mark-unfit';
import { takeOnBench } from '@/server/commands/tag/take-on-bench';
import { checkScene } from './check-script';
import type { Script } from './director';
import { ago, later, tagOf, type Telling } from './told';
import { TURNS, type Turn } from './turns';

async function* turnScript(telling: Telling, bench: number, { who, at, told }: Turn): Script {
  const benchId = telling.setting.benches[bench]!.id;
  const operator = telling.setting.crew[bench]!;
  const { tagId, code } = tagOf(telling, who);
  await telling.run(callTag, operator, { benchId, tagId });
  if (told.kind === 'called') return;

  yield ago(telling, at - 1.5);
  if (told.kind === 'away') {
    yield ago(telling, at - 6);
    await telling.run(markAway, operator, { tagId });
    return;
  }
  await telling.run(takeOnBench, operator, { tagId, benchId });
  yield ago(telling, at - 2.5);
  if (told.kind === 'unfit') {
    await telling.run(markUnfit, operator, { tagId, reason: told.reason });
    await telling.run(hangTool, operator, { tagId });
    return;
  }
  yield* checkScene(telling, { benchId, operator }, who, told);
  if (told.half !== undefined) return;

  const then = told.then ?? 'returned';
  yield later(telling, 60);
  if (then !== 'returned') await telling.run(hangTool, operator, { tagId });
  if (then === 'peg') return;
  if (then === 'peg, then returned') yield later(telling, 300);
  await telling.run(handBack, operator, { tagId, ticketCode: code });
}

async function* benchScript(telling: Telling, bench: number, turns: readonly Turn[]): Script {
  const benchId = telling.setting.benches[bench]!.id;
  const operator = telling.setting.crew[bench]!;
  yield ago(telling, turns[0]!.at + 2);
  await telling.run(takeBench, operator, { benchId });
  for (const turn of turns) {
    yield ago(telling, turn.at);
    yield* turnScript(telling, bench, turn);
  }
  await telling.run(leaveBench, operator, { benchId });
}

/** What happens at each bench, each in a script of its own. */
export const benchScripts = (telling: Telling): Script[] =>
  TURNS.map((turns, bench) => benchScript(telling, bench, turns));
