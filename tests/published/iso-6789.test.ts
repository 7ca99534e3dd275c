import { describe, expect, it } from 'vitest';
import { relativeDeviation } from '@/lib/torque/deviation';
import { permissibleDeviation, toleranceAt, type ToolClass } from '@/lib/torque/tool';

describe('ISO 6789:2003: permissible deviation by class and maximum torque', () => {
  it.each<[ToolClass, number, number]>([
    ['I-A', 340, 6],
    ['I-B', 80, 4],
    ['I-C', 8, 6],
    ['II-A', 340, 4],
  ])('%s, %d N·m: %d %%', (toolClass, maxNm, percent) => {
    expect(permissibleDeviation(toolClass, maxNm)).toBe(percent);
  });
});

describe('ISO 6789-1, definition of the deviation: where the limits fall for a tool set to 100', () => {
  it.each([
    [4, 96.154, 104.167],
    [6, 94.34, 106.383],
  ])('±%d %%: tester %d to %d (computed)', (percent, least, most) => {
    expect((100 / (1 + percent / 100)).toFixed(3)).toBe(least.toFixed(3));
    expect((100 / (1 - percent / 100)).toFixed(3)).toBe(most.toFixed(3));
    expect(relativeDeviation(100, 100 / (1 + percent / 100))).toBeCloseTo(percent, 12);
    expect(relativeDeviation(100, 100 / (1 - percent / 100))).toBeCloseTo(-percent, 12);
    expect(relativeDeviation(100, least)).toBeCloseTo(percent, 2);
    expect(relativeDeviation(100, most)).toBeCloseTo(-percent, 2);
  });
});

describe('ASME B107.300 practice: ±4 % clockwise, ±6 % counter-clockwise, 20 to 100 % of range', () => {
  const at = (direction: 'cw' | 'ccw', targetNm: number) =>
    toleranceAt({
      claim: { of: 'reading', cwPercent: 4, ccwPercent: 6, fromPercent: 20 },
      toolClass: 'II-A',
      range: { min: 20, max: 200 },
      direction,
      targetNm,
      basis: 'set',
    });
  it('each direction has its own limits', () => {
    expect(at('cw', 100)).toEqual({ lower: -4, upper: 4, source: 'claim' });
    expect(at('ccw', 100)).toEqual({ lower: -6, upper: 6, source: 'claim' });
  });
  it('starts at a fifth of the range and not below', () => {
    expect(at('cw', 40)).not.toBeNull();
    expect(at('cw', 39)).toBeNull();
  });
});
