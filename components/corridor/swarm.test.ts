import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { swarmOffsets } from './swarm';

const size = { plotWidthPx: 200, dotRadiusPx: 5, swarmHeightPx: 40 };

describe('swarmOffsets', () => {
  it('leaves dots that are apart on the middle line', () => {
    expect(swarmOffsets([0.1, 0.3, 0.5], size)).toEqual([0, 0, 0]);
  });

  it('spreads equal readings so that none hides another', () => {
    const offsets = swarmOffsets([0.5, 0.5, 0.5, 0.5, 0.5], size);
    const sorted = [...offsets].sort((a, b) => a - b);
    sorted.slice(1).forEach((offset, index) => {
      expect(offset - (sorted[index] ?? 0)).toBeGreaterThanOrEqual(9);
    });
  });

  it('never moves an earlier dot', () => {
    const position = fc.double({ min: 0, max: 1, noNaN: true });
    fc.assert(
      fc.property(fc.array(position, { minLength: 1, maxLength: 12 }), (positions) => {
        const before = swarmOffsets(positions.slice(0, -1), size);
        expect(swarmOffsets(positions, size).slice(0, -1)).toEqual(before);
      }),
    );
  });

  it('stays within its height when it is full', () => {
    const offsets = swarmOffsets(
      Array.from({ length: 30 }, () => 0.5),
      size,
    );
    offsets.forEach((offset) => expect(Math.abs(offset)).toBeLessThanOrEqual(20));
  });
});
