import { holdTag } from '@/server/commands/tag/hold';
import { hangTool } from '@/server/commands/tag/hang';
import { joinLine } from '@/server/commands/tag/join';
import { withdrawTag } from '@/server/commands/tag/withdraw';
import { CAST, type Name, type Part } from './cast';
import type { Script } from './director';
import { MEET_ID, STAFF_IDS } from './ids';
import { staffActor } from './stage';
import { tagOf, type Telling } from './told';
import { TOOLS } from './tools';

async function* partScript(telling: Telling, who: Name, part: Part): Script {
  yield telling.ago(part.joins);
  const joined = await telling.run(
    joinLine,
    { kind: 'public' },
    {
      meetId: MEET_ID,
      tool: TOOLS[part.tool],
      consent: part.workingPoints ? 'working' : 'maximum',
      workingPoints: part.workingPoints ? [...part.workingPoints] : null,
      visitor: { name: part.name ?? null, email: part.email ?? null, mobile: null },
    },
  );
  telling.tags.set(who, joined);
  const { tagId } = tagOf(telling, who);
  if (part.leaves) {
    yield telling.ago(part.joins - 1);
    await telling.run(hangTool, staffActor(STAFF_IDS.lead), { tagId });
  }
  if (part.held) {
    yield telling.ago(part.held.at);
    const { minutes } = part.held;
    await telling.run(holdTag, staffActor(STAFF_IDS.lead), { tagId, minutes });
  }
  if (part.withdraws !== undefined) {
    yield telling.ago(part.withdraws);
    await telling.run(withdrawTag, { kind: 'visitor', tagId }, { tagId });
  }
}

/** What the visitors do, each in a script of their own. */
export const lineScripts = (telling: Telling): Script[] =>
  Object.entries(CAST).map(([who, part]) => partScript(telling, who as Name, part));
