import fc from 'fast-check';
import { expect, it } from 'vitest';
import { buildPlan, SCHEMES, type PlanInput } from './plan';
import { isFixedTool, isSettingTool, TOOL_CLASSES } from './tool';
import { TORQUE_UNITS } from './units';

const inputs: fc.Arbitrary<PlanInput> = fc
  .record({
    toolClass: fc.constantFrom(...TOOL_CLASSES),
    unit: fc.constantFrom(...TORQUE_UNITS),
    scheme: fc.constantFrom(...SCHEMES),
    division: fc.constantFrom(0.05, 0.1, 0.25, 0.5, 1, 2, 5),
    lowest: fc.integer({ min: 1, max: 50 }),
    span: fc.integer({ min: 0, max: 200 }),
    within: fc.array(fc.double({ min: 0, max: 1, noNaN: true }), { minLength: 1, maxLength: 5 }),
    directions: fc.constantFrom<PlanInput['directions'][]>(['cw'], ['ccw'], ['cw', 'ccw']),
  })
  .map(({ lowest, span, within, division, ...rest }) => {
    const min = lowest * division;
    const max = (lowest + span) * division;
    const workingPoints = within.map((share) => min + share * (max - min));
    return { ...rest, division, range: { min, max }, nominal: max, workingPoints };
  });

it('every plan stays in the range, on the scale, in order, and whole', () => {
  fc.assert(
    fc.property(inputs, (input) => {
      const plan = buildPlan(input);
      const { division = 1, range } = input;
      const top = Math.max(...plan.points.map((point) => point.target));
      for (const { target } of plan.steps) {
        expect(target).toBeGreaterThanOrEqual(range.min * (1 - 1e-9));
        expect(target).toBeLessThanOrEqual(range.max * (1 + 1e-9));
        const marks = target / (division ?? 1);
        expect(Math.abs(marks - Math.round(marks))).toBeLessThan(1e-6);
      }
      for (const direction of input.directions) {
        const steps = plan.steps.filter((step) => step.direction === direction);
        const targets = steps.slice(plan.exercisePulls).map((step) => step.target);
        expect(steps.slice(0, plan.exercisePulls).every((s) => s.kind === 'exercise')).toBe(true);
        expect(steps.slice(plan.exercisePulls).every((s) => s.kind === 'reading')).toBe(true);
        expect(targets).toEqual([...targets].sort((a, b) => a - b));
        const points = plan.points.filter((point) => point.direction === direction);
        expect(new Set(points.map((point) => point.target)).size).toBe(points.length);
        expect(targets).toHaveLength(points.length * plan.readingsPerPoint);
        for (const { target } of points) {
          expect(targets.filter((other) => other === target)).toHaveLength(plan.readingsPerPoint);
        }
      }
      expect(plan.steps.every((s) => s.kind === 'reading' || s.target === top)).toBe(true);
      if (isFixedTool(input.toolClass)) expect(plan.points).toHaveLength(input.directions.length);
      if (!isSettingTool(input.toolClass)) expect(plan.exercisePulls).toBe(1);
    }),
    { numRuns: 500 },
  );
});

it('no plan pulls above a tester, whatever its range', () => {
  fc.assert(
    fc.property(inputs, fc.double({ min: 0.5, max: 300, noNaN: true }), (input, maxNm) => {
      const tester = { ...input, testerRange: { minNm: 0.1, maxNm } };
      const free = buildPlan(input);
      const factor = { 'N.m': 1, 'lbf.ft': 1.3558179483314004, 'lbf.in': 0.1129848290276167 };
      const inNm = {
        ...factor,
        'ozf.in': 0.00706155181422604,
        'kgf.m': 9.80665,
        'kgf.cm': 0.0980665,
      };
      const highest = Math.max(...free.steps.map((step) => step.target)) * inNm[input.unit];
      if (highest > maxNm * (1 + 1e-6)) expect(() => buildPlan(tester)).toThrow(RangeError);
      if (highest < maxNm * (1 - 1e-6)) expect(buildPlan(tester)).toEqual(free);
    }),
  );
});
