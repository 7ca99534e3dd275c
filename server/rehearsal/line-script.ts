import { holdTag } from '@/server/commands/tag/hold';
import { hangTool } from '@/server/commands/tag/hang';
import { joinLine } from '@/server/commands/tag/join';
import { withdrawTag } from '@/server/commands/tag/withdraw';
import { CAST, type Name, type Part } from './cast';
import type { Script } from './director';
import { ago, tagOf, type Telling } from './told';
import { TOOLS } from './tools';

async function* partScript(telling: Telling, who: Name, part: Part): Script {
  yield ago(telling, part.joins);
  const joined = await telling.run(
    joinLine,
    { kind: 'public' },
    {
      meetId: telling.setting.meet.id,
      tool: TOOLS[part.tool],
      consent: part.workingPoints ? 'working' : 'maximum',
      workingPoints: part.workingPoints ? [...part.workingPoints] : null,
      visitor: { name: part.name ?? null, email: part.email ?? null, mobile: null },
    },
  );
  telling.tags.set(who, joined);
  const { tagId } = tagOf(telling, who);
  if (part.leaves) {
    yield ago(telling, part.joins - 1);
    await telling.run(hangTool, telling.setting.lead, { tagId });
  }
  if (part.held) {
    yield ago(telling, part.held.at);
    const { minutes } = part.held;
    await telling.run(holdTag, telling.setting.lead, { tagId, minutes });
  }
  if (part.withdraws !== undefined) {
    yield ago(telling, part.withdraws);
    await telling.run(withdrawTag, { kind: 'visitor', tagId }, { tagId });
  }
}

/** What the visitors do, each in a script of their own. */
export const lineScripts = (telling: Telling): Script[] =>
  Object.entries(CAST).map(([who, part]) => partScript(telling, who as Name, part));
