import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { freePeg, nextTag, positionAt, waitingOrder, type LineTag } from './order';

const NOW = new Date('2026-10-09T10:00:00Z');
const tag = (id: string, position: number, more: Partial<LineTag> = {}): LineTag => ({
  id,
  position,
  state: 'waiting',
  place: 'visitor',
  heldUntil: null,
  ...more,
});

describe('the order of the line', () => {
  it('is first come, first served, of those who wait', () => {
    const line = [tag('c', 3), tag('a', 1), tag('b', 2, { state: 'away' })];
    expect(waitingOrder(line).map(({ id }) => id)).toEqual(['a', 'c']);
  });

  it('passes over a held turn, which keeps its place', () => {
    const line = [tag('a', 1, { heldUntil: new Date('2026-10-09T10:10:00Z') }), tag('b', 2)];
    expect(nextTag(line, NOW)?.id).toBe('b');
    expect(nextTag(line, new Date('2026-10-09T10:10:00Z'))?.id).toBe('a');
  });

  it('puts a tag at any place, whatever the others’ positions are', () => {
    fc.assert(
      fc.property(
        fc.uniqueArray(fc.integer({ min: -1000, max: 1000 }), { maxLength: 30 }),
        fc.integer({ min: 1, max: 40 }),
        (positions, place) => {
          const others = positions.map((position, index) => tag(String(index), position));
          const moved = tag('moved', positionAt(others, place));
          const at = waitingOrder([...others, moved]).findIndex(({ id }) => id === 'moved') + 1;
          expect(at).toBe(Math.min(place, others.length + 1));
        },
      ),
    );
  });

  it('refuses a place that is none', () => {
    expect(() => positionAt([], 0)).toThrow(RangeError);
  });
});

it('freePeg gives the lowest peg that nothing hangs on', () => {
  expect(freePeg([])).toBe(1);
  expect(freePeg([1, 2, 4])).toBe(3);
});
