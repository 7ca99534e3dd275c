import { joinLine } from '@/server/commands/tag/join';
import { returnToLine } from '@/server/commands/tag/return-to-line';
import { withdrawTag } from '@/server/commands/tag/withdraw';
import type { Backstage, OpenTag } from './backstage';
import { MAX_WAITING, WITHDRAW_SHARE } from './pace';
import { TOOLS, type Tool } from './tools';

const NAMES = ['Alder', 'Brona', 'Cass', 'Dell', 'Emrys', 'Fenna', 'Gorse', 'Hale', null, null];

/** Tools that both benches can check over most of their range. */
const BROUGHT: readonly Tool[] = [
  TOOLS.click,
  TOOLS.clickLarge,
  TOOLS.clickFeet,
  TOOLS.clickTruck,
  TOOLS.clickBothWays,
  TOOLS.dial,
  TOOLS.bar,
  TOOLS.electronicLarge,
  TOOLS.adapter,
  TOOLS.preset,
  TOOLS.barSet,
];

const oneOf = <Item>(items: readonly Item[], random: () => number): Item =>
  items[Math.floor(random() * items.length)]!;

async function join({ run, setting, random, own }: Backstage): Promise<void> {
  const { serial: _serial, ...tool } = oneOf(BROUGHT, random);
  const { tagId } = await run(
    joinLine,
    { kind: 'public' },
    {
      meetId: setting.meet.id,
      tool,
      consent: 'maximum',
      visitor: { name: oneOf(NAMES, random), email: null, mobile: null },
    },
  );
  own.add(tagId);
}

/** Somebody joins now and then; sometimes one who waits goes; one who stayed away comes back. */
export async function visitorsAct(scene: Backstage, open: readonly OpenTag[]): Promise<void> {
  const { timing, random, run, setting, own } = scene;
  const waiting = open.filter(({ state }) => state === 'waiting');
  if (timing.isDue('join', 'line') && waiting.length < MAX_WAITING) {
    await join(scene);
    const leaving = waiting.filter(({ id, place }) => own.has(id) && place === 'visitor');
    if (leaving.length > 0 && random() < WITHDRAW_SHARE) {
      const { id: tagId } = oneOf(leaving, random);
      await run(withdrawTag, { kind: 'visitor', tagId }, { tagId });
      own.delete(tagId);
    }
  }
  for (const { id: tagId, state } of open) {
    if (state === 'away' && own.has(tagId) && timing.isDue('comeBack', tagId)) {
      await run(returnToLine, setting.crew[0]!, { tagId });
    }
  }
}
