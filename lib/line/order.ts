import type { TagPlace, TagState } from './states';

export interface LineTag {
  id: string;
  state: TagState;
  place: TagPlace;
  /** Lower comes first. A lead's move changes it; nothing else does. */
  position: number;
  heldUntil: Date | null;
}

const held = (tag: LineTag, now: Date): boolean =>
  tag.heldUntil !== null && tag.heldUntil.getTime() > now.getTime();

/** The waiting tags in the order in which they will be taken; held ones keep their place in it. */
export function waitingOrder<T extends LineTag>(tags: readonly T[]): T[] {
  return tags.filter((tag) => tag.state === 'waiting').sort((a, b) => a.position - b.position);
}

/** The tag that a bench takes next: the first in order whose turn is not held, or null. */
export function nextTag<T extends LineTag>(tags: readonly T[], now: Date): T | null {
  return waitingOrder(tags).find((tag) => !held(tag, now)) ?? null;
}

/**
 * The position that puts a tag at `place` (1 = first) among the other waiting tags.
 * @throws RangeError when `place` is not a whole number from 1.
 */
export function positionAt(others: readonly LineTag[], place: number): number {
  if (!Number.isInteger(place) || place < 1)
    throw new RangeError('A place in the line is 1 or more.');
  const order = waitingOrder(others);
  const before = order[place - 2];
  const after = order[place - 1];
  if (before && after) return (before.position + after.position) / 2;
  if (after) return after.position - 1;
  const last = order.at(-1);
  return last ? last.position + 1 : 1;
}

/** The lowest peg number that is free. Pegs are numbered from 1. */
export function freePeg(taken: Iterable<number>): number {
  const used = new Set(taken);
  let peg = 1;
  while (used.has(peg)) peg += 1;
  return peg;
}
