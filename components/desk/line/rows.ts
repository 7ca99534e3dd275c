import { stateWords } from '@/lib/line/machine';
import type { TagState } from '@/lib/line/states';
import type { DeskSnapshot } from '@/lib/live/contract';

export type DeskTag = DeskSnapshot['tags'][number];

/** A tag as a row of the desk's table. */
export interface LineRow {
  tag: DeskTag;
  /** 1 is next; null when not waiting. */
  place: number | null;
  isHeld: boolean;
  /** 'Waiting', 'Called to bench 2' … */
  state: string;
  /** Where the tool itself is: 'visitor', 'peg 14', 'bench 2'. */
  where: string;
}

/** What needs the lead first stands first; the line itself is in calling order. */
const GROUPS: TagState[] = [
  'called',
  'on_bench',
  'waiting',
  'away',
  'ready',
  'unfit',
  'withdrawn',
  'returned',
];

/** The same words with a capital at their head. */
export const capital = (words: string): string => words.charAt(0).toUpperCase() + words.slice(1);

function stateOf(tag: DeskTag, isHeld: boolean): string {
  if (tag.state === 'called' && tag.benchNumber !== null)
    return `Called to bench ${tag.benchNumber}`;
  if (tag.state === 'waiting' && isHeld) return 'Waiting, held';
  return capital(stateWords(tag.state));
}

const whereOf = (tag: DeskTag): string => {
  if (tag.place === 'peg') return `peg ${tag.peg ?? '?'}`;
  if (tag.place === 'bench') return `bench ${tag.benchNumber ?? '?'}`;
  return tag.place;
};

/** The rows of the desk's table: called and on the benches, the line, then all who wait for nothing. */
export function lineRows({ line, tags }: DeskSnapshot): LineRow[] {
  const places = new Map(
    line.waiting.map((tag, index) => [tag.code, { place: index + 1, held: tag.held }]),
  );
  return tags
    .map((tag) => {
      const found = tag.state === 'waiting' ? places.get(tag.code) : undefined;
      const isHeld = found?.held ?? false;
      return {
        tag,
        place: found?.place ?? null,
        isHeld,
        state: stateOf(tag, isHeld),
        where: whereOf(tag),
      };
    })
    .sort(
      (a, b) =>
        GROUPS.indexOf(a.tag.state) - GROUPS.indexOf(b.tag.state) ||
        (a.place ?? 0) - (b.place ?? 0) ||
        a.tag.code.localeCompare(b.tag.code),
    );
}
