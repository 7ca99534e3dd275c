import { describe, expect, it } from 'vitest';
import { isReferenceTooCoarse, judgeCheck, judgePoint, type PointToJudge } from './verdict';

const limits = { lower: -4, upper: 4 };
const judge = (deviations: number[], more: Partial<PointToJudge> = {}) =>
  judgePoint({ deviations, limits, referenceExpanded: 0.5, ...more });

describe('judgePoint', () => {
  it('within when every reading is inside the shrunk limits, these included', () => {
    expect(judge([3.5, -3.5, 0])).toEqual({
      verdict: 'within',
      reasons: ['all-within'],
      simpleVerdict: 'within',
    });
  });
  it('too close between the shrunk and the widened limits, these included', () => {
    expect(judge([0, 3.51])).toMatchObject({ verdict: 'too-close', simpleVerdict: 'within' });
    expect(judge([0, 4.5])).toMatchObject({ verdict: 'too-close', simpleVerdict: 'outside' });
    expect(judge([0, -4.5])).toMatchObject({ verdict: 'too-close', reasons: ['in-guard-band'] });
  });
  it('outside when one reading is beyond the widened limits, whatever the mean', () => {
    expect(judge([0, 0, 0, 4.51])).toMatchObject({ verdict: 'outside', simpleVerdict: 'outside' });
    expect(judge([0, 0, 0, -4.51]).reasons).toEqual(['reading-beyond-limits']);
  });
  it('equality survives decimal rounding', () => {
    // 4 − 0.83·0.9 and 0.1 + 0.2 do not come out as written.
    const guard = { guard: 0.83, referenceExpanded: 0.9 };
    expect(judge([3.253], guard).verdict).toBe('within');
    expect(judge([4.747], guard).verdict).toBe('too-close');
    const narrow = { limits: { lower: -0.3, upper: 0.3 }, referenceExpanded: 0 };
    expect(judge([0.1 + 0.2], narrow).verdict).toBe('within');
  });
  it('guard 0 is simple acceptance: never too close', () => {
    expect(judge([4], { guard: 0 }).verdict).toBe('within');
    expect(judge([4.01], { guard: 0 }).verdict).toBe('outside');
  });
  it('not judged by a reference worse than a quarter of the smaller limit', () => {
    expect(judge([0], { referenceExpanded: 1 }).verdict).toBe('within');
    expect(judge([0], { referenceExpanded: 1.001 })).toEqual({
      verdict: 'not-judged',
      reasons: ['reference-too-coarse'],
      simpleVerdict: 'not-judged',
    });
    expect(judge([20], { referenceExpanded: 1.001 }).verdict).toBe('not-judged');
    const lopsided = { lower: -2, upper: 6 };
    expect(isReferenceTooCoarse(lopsided, 0.5)).toBe(false);
    expect(isReferenceTooCoarse(lopsided, 0.51)).toBe(true);
  });
  it('a barred check is not judged, however the readings fall', () => {
    const barred = ['not-proved-today', 'tester-locked'];
    expect(judge([20], { barred })).toEqual({
      verdict: 'not-judged',
      reasons: barred,
      simpleVerdict: 'not-judged',
    });
  });
  it('a missing reading: outside still stands, all else is not judged', () => {
    expect(judge([0, 0], { requiredReadings: 3 })).toMatchObject({
      verdict: 'not-judged',
      reasons: ['readings-missing'],
    });
    expect(judge([0, 5], { requiredReadings: 3 }).verdict).toBe('outside');
    expect(judge([0, 4.2], { requiredReadings: 3 })).toMatchObject({
      verdict: 'not-judged',
      simpleVerdict: 'outside',
    });
    expect(judge([], { requiredReadings: 3 }).reasons).toEqual(['no-readings']);
  });
  it('more readings than asked for all count', () => {
    expect(judge([0, 0, 0, 5], { requiredReadings: 3 }).verdict).toBe('outside');
  });
  it('no release by a torque beyond the limits is outside, though readings are missing', () => {
    // Set 100, not released by 130: at least −23.1 %.
    expect(judge([], { noRelease: -23.1, requiredReadings: 5 })).toMatchObject({
      verdict: 'outside',
      reasons: ['no-release'],
    });
    // Stopped at a torque that is inside the limits: nothing is known.
    expect(judge([], { noRelease: -2, requiredReadings: 5 }).verdict).toBe('not-judged');
  });
  it('what the plan asks for and was not done is not judged', () => {
    expect(judge([0], { unmet: ['exercise-missing'] }).reasons).toEqual(['exercise-missing']);
    expect(judge([5], { unmet: ['exercise-missing'] }).verdict).toBe('outside');
  });
  it('limits that the guard band closes leave nothing within', () => {
    expect(judge([0], { guard: 9 }).verdict).toBe('too-close');
  });
  it('judges limits that are not alike on both sides', () => {
    const lopsided = { limits: { lower: -2, upper: 6 } };
    expect(judge([5.5], lopsided).verdict).toBe('within');
    expect(judge([-1.6], lopsided).verdict).toBe('too-close');
    expect(judge([-2.6], lopsided).verdict).toBe('outside');
  });
  it('refuses bad input', () => {
    expect(() => judge([])).toThrow(RangeError);
    expect(() => judge([Number.NaN])).toThrow(RangeError);
    expect(() => judge([0], { limits: { lower: 4, upper: -4 } })).toThrow(RangeError);
    expect(() => judge([0], { limits: { lower: -4, upper: Infinity } })).toThrow(RangeError);
    expect(() => judge([0], { referenceExpanded: -1 })).toThrow(RangeError);
    expect(() => judge([0], { guard: Number.NaN })).toThrow(RangeError);
    expect(() => judge([0], { requiredReadings: 1.5 })).toThrow(RangeError);
  });
});

describe('judgeCheck', () => {
  const check = (...verdicts: Parameters<typeof judgeCheck>[0][number]['verdict'][]) =>
    judgeCheck(verdicts.map((verdict) => ({ verdict })));
  it('outside before not judged before too close before within', () => {
    expect(check('within', 'too-close', 'not-judged', 'outside')).toBe('outside');
    expect(check('within', 'too-close', 'not-judged')).toBe('not-judged');
    expect(check('within', 'too-close')).toBe('too-close');
    expect(check('within', 'within')).toBe('within');
  });
  it('does not count an excluded point, and needs one that counts', () => {
    const outside = { verdict: 'outside' as const, excluded: true };
    expect(judgeCheck([outside, { verdict: 'within' }])).toBe('within');
    expect(judgeCheck([outside])).toBe('not-judged');
    expect(judgeCheck([])).toBe('not-judged');
  });
});
