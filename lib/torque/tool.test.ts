import { describe, expect, it } from 'vitest';
import type { Claim } from './claim';
import { isSettingTool, permissibleDeviation, toleranceAt, TOOL_CLASSES } from './tool';
import type { Basis, Direction, ToolClass } from './tool';

describe('permissibleDeviation', () => {
  it('goes by the class, and for some by the maximum, 10 N·m included', () => {
    const at10 = TOOL_CLASSES.map((toolClass) => permissibleDeviation(toolClass, 10));
    expect(new Set(at10)).toEqual(new Set([6]));
    const four = TOOL_CLASSES.filter((toolClass) => permissibleDeviation(toolClass, 10.01) === 4);
    expect(four).toEqual(['I-B', 'I-C', 'I-E', 'II-A', 'II-B', 'II-C']);
  });
  it('refuses unknown classes and maxima', () => {
    expect(() => permissibleDeviation('III-A' as ToolClass, 10)).toThrow(RangeError);
    expect(() => permissibleDeviation('II-A', 0)).toThrow(RangeError);
    expect(() => permissibleDeviation('II-A', Number.NaN)).toThrow(RangeError);
  });
});

describe('isSettingTool', () => {
  it('is Type II', () => {
    expect(isSettingTool('II-G')).toBe(true);
    expect(isSettingTool('I-E')).toBe(false);
  });
});

describe('toleranceAt', () => {
  const at = (
    claim: Claim | null,
    targetNm: number,
    basis: Basis = 'reference',
    direction: Direction = 'cw',
  ) =>
    toleranceAt({
      claim,
      toolClass: 'II-A',
      range: { min: 20, max: 200 },
      direction,
      targetNm,
      basis,
    });
  const reading: Claim = { of: 'reading', cwPercent: 3, ccwPercent: null };

  it('is the standard’s without a claim, on either basis', () => {
    expect(at(null, 20)).toEqual({ lower: -4, upper: 4, source: 'standard' });
    expect(at(null, 200, 'set')).toEqual({ lower: -4, upper: 4, source: 'standard' });
  });
  it('is null below the tool’s own range', () => {
    expect(at(null, 19.9)).toBeNull();
    expect(at(null, 0)).toBeNull();
  });
  it('takes a claim of reading as it is, from a fifth of the range', () => {
    expect(at(reading, 40)).toEqual({ lower: -3, upper: 3, source: 'claim' });
    expect(at(reading, 40 * (1 - 1e-12))).not.toBeNull();
    expect(at(reading, 39.9)).toBeNull();
    expect(at({ ...reading, fromPercent: 10 }, 20)).not.toBeNull();
  });
  it('falls back to the standard in a direction of which the claim does not speak', () => {
    expect(at(reading, 100, 'reference', 'ccw')).toEqual({
      lower: -4,
      upper: 4,
      source: 'standard',
    });
  });
  it('turns a claim of full scale into limits at the target', () => {
    const claim: Claim = { of: 'full-scale', cwPercent: 1, ccwPercent: 2 };
    // A = 2 N·m; at 50: −100·2/52 to 100·2/48, and ±4 on the set basis.
    expect(at(claim, 50)).toEqual({ lower: -200 / 52, upper: 200 / 48, source: 'claim' });
    expect(at(claim, 50, 'set')).toEqual({ lower: -4, upper: 4, source: 'claim' });
    expect(at(claim, 50, 'set', 'ccw')).toEqual({ lower: -8, upper: 8, source: 'claim' });
  });
  it('adds display steps to a claim of reading', () => {
    const claim: Claim = { of: 'reading', cwPercent: 1, ccwPercent: null, plusNm: 0.5 };
    expect(at(claim, 50, 'set')).toEqual({ lower: -2, upper: 2, source: 'claim' });
    const limits = at(claim, 50);
    // 50 delivered as x_r is on the limit when |50 − x_r| = 0.01·x_r + 0.5.
    const least = 49.5 / 1.01;
    const most = 50.5 / 0.99;
    expect(limits?.upper).toBeCloseTo((100 * (50 - least)) / least, 12);
    expect(limits?.lower).toBeCloseTo((100 * (50 - most)) / most, 12);
  });
  it('is null where an absolute claim leaves no limit', () => {
    const claim: Claim = { of: 'full-scale', cwPercent: 12, ccwPercent: null, fromPercent: 0 };
    expect(at(claim, 24)).toBeNull();
    expect(at(claim, 25)).not.toBeNull();
  });
  it('refuses bad input', () => {
    expect(() => at(null, -1)).toThrow(RangeError);
    expect(() => at(null, Number.NaN)).toThrow(RangeError);
    expect(() => at({ ...reading, cwPercent: -1 }, 100)).toThrow(RangeError);
    expect(() => at({ ...reading, cwPercent: 0 }, 100)).toThrow(/above zero/);
    expect(() => at(null, 50, 'iso' as Basis)).toThrow(RangeError);
    expect(() => at(null, 50, 'set', 'left' as Direction)).toThrow(RangeError);
  });
});
