import { benchOf, lineOf } from '@/components/board/fixture';
import type { DeskSnapshot } from '@/lib/live/contract';
import type { DeskTag } from './rows';

/** A tag as the desk sees it, waiting unless said otherwise. For tests. */
export const deskTag = (code: string, values: Partial<DeskTag> = {}): DeskTag => ({
  id: `id-${code}`,
  code,
  state: 'waiting',
  place: 'visitor',
  peg: null,
  benchNumber: null,
  tool: 'Click wrench',
  plate: '60–340 N·m',
  toolClass: 'II-A',
  visitorName: null,
  consent: 'maximum',
  heldUntil: null,
  unfitReason: null,
  joinedAt: '2026-06-13T08:30:00.000Z',
  ...values,
});

/** A desk with these tags and two free benches; those that wait stand in the line as given. */
export function deskOf(tags: DeskTag[]): DeskSnapshot {
  const line = lineOf(0, {
    benches: [benchOf(1), benchOf(2)],
    waiting: tags
      .filter((tag) => tag.state === 'waiting')
      .map((tag) => ({
        code: tag.code,
        held: tag.heldUntil !== null,
        withUs: tag.place !== 'visitor',
      })),
  });
  const benches = line.benches.map(({ id, number }) => ({
    id,
    number,
    operator: null,
    tester: null,
    barred: [],
  }));
  return { revision: 1, at: line.at, line, tags, benches };
}
