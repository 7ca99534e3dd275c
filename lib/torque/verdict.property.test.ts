import fc from 'fast-check';
import { expect, it } from 'vitest';
import { judgePoint, type Verdict } from './verdict';

const tenths = (least: number, most: number) =>
  fc.integer({ min: least * 10, max: most * 10 }).map((value) => value / 10);

const cases = fc.record({
  deviations: fc.array(tenths(-8, 8), { minLength: 1, maxLength: 6 }),
  lower: tenths(-6, -1),
  upper: tenths(1, 6),
  referenceExpanded: fc.integer({ min: 0, max: 20 }).map((value) => value / 10),
  guard: fc.constantFrom(0, 0.5, 1, 2),
  required: fc.integer({ min: 1, max: 6 }),
  barred: fc.constantFrom([], ['tester-locked']),
});

interface Case {
  deviations: number[];
  lower: number;
  upper: number;
  referenceExpanded: number;
  required: number;
  barred: readonly string[];
}

const whole = (value: number) => Math.round(value * 1000);

/** The rule once more, in whole thousandths, so that no rounding can decide. */
function expected(one: Case, guard: number): Verdict {
  const [lower, upper, u] = [whole(one.lower), whole(one.upper), whole(one.referenceExpanded)];
  const g = Math.round(u * guard);
  const values = one.deviations.map(whole);
  if (one.barred.length > 0 || 4 * u > Math.min(-lower, upper)) return 'not-judged';
  if (values.some((d) => d > upper + g || d < lower - g)) return 'outside';
  if (values.length < one.required) return 'not-judged';
  return values.every((d) => d <= upper - g && d >= lower + g) ? 'within' : 'too-close';
}

it('follows the order of the rule, limits included, with and without guard', () => {
  fc.assert(
    fc.property(cases, (one) => {
      const { deviations, lower, upper, referenceExpanded, guard, required, barred } = one;
      const judged = judgePoint({
        deviations,
        limits: { lower, upper },
        referenceExpanded,
        guard,
        requiredReadings: required,
        barred,
      });
      expect(judged.verdict).toBe(expected(one, guard));
      expect(judged.simpleVerdict).toBe(expected(one, 0));
      expect(judged.reasons.length).toBeGreaterThan(0);
    }),
    { numRuns: 3000 },
  );
});

it('does not depend on the order of the readings, nor on which side is which', () => {
  fc.assert(
    fc.property(cases, ({ deviations, lower, upper, referenceExpanded, guard, required }) => {
      const judge = (values: number[], limits: { lower: number; upper: number }) =>
        judgePoint({
          deviations: values,
          limits,
          referenceExpanded,
          guard,
          requiredReadings: required,
        });
      const straight = judge(deviations, { lower, upper });
      expect(judge([...deviations].reverse(), { lower, upper })).toEqual(straight);
      const turned = deviations.map((value) => -value);
      expect(judge(turned, { lower: -upper, upper: -lower })).toEqual(straight);
    }),
  );
});

it('a wider guard never turns within into outside or back: it can only leave too close', () => {
  fc.assert(
    fc.property(cases, (one) => {
      const point = {
        deviations: one.deviations,
        limits: { lower: one.lower, upper: one.upper },
        referenceExpanded: one.referenceExpanded,
      };
      const narrow = judgePoint({ ...point, guard: 0 }).verdict;
      const wide = judgePoint({ ...point, guard: 1 }).verdict;
      expect([narrow, 'too-close']).toContain(wide);
    }),
  );
});
