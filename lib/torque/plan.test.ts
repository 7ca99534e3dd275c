import { describe, expect, it } from 'vitest';
import { buildPlan, type CheckPlan, type PlanInput } from './plan';

const click: PlanInput = {
  toolClass: 'II-A',
  range: { min: 60, max: 340 },
  unit: 'N.m',
  division: 1,
  directions: ['cw'],
  scheme: 'iso-2003',
};
const targets = (plan: CheckPlan) => plan.points.map((point) => point.target);
const outline = (plan: CheckPlan) =>
  plan.steps.map((step) => `${step.kind[0]}${step.target}${step.direction}`).join(' ');

describe('buildPlan, the standard’s sequences', () => {
  it('iso-2003: 20, 60, 100 % with five exercise pulls and five readings', () => {
    const plan = buildPlan(click);
    expect(targets(plan)).toEqual([68, 204, 340]);
    expect(plan).toMatchObject({
      isStandardSequence: true,
      setting: true,
      basis: 'reference',
      guard: 1,
      exercisePulls: 5,
      readingsPerPoint: 5,
      edition: 'ISO 6789:2003',
      departures: [],
    });
    expect(plan.steps).toHaveLength(20);
    expect(plan.steps[0]).toEqual({
      kind: 'exercise',
      direction: 'cw',
      target: 340,
      minLoadSeconds: 0.5,
      maxLoadSeconds: 4,
    });
  });
  it('rounds 20 % down to a mark, 60 % to the nearest with ties down', () => {
    expect(targets(buildPlan({ ...click, division: 5 }))).toEqual([65, 205, 340]);
    expect(targets(buildPlan({ ...click, range: { min: 5, max: 50 }, division: 4 }))).toEqual([
      8, 28, 48,
    ]);
    // 60 % of 50 is 30, half way between 28 and 32 of a scale in fours.
  });
  it('takes the lowest mark where 20 % is below the scale, and says so', () => {
    const plan = buildPlan({ ...click, range: { min: 100, max: 340 }, division: 10 });
    expect(targets(plan)).toEqual([100, 200, 340]);
    expect(plan.notes.join()).toContain('below the scale');
    expect(plan.isStandardSequence).toBe(true);
  });
  it('iso-2017: lowest mark, 60, 100 %, with its own times', () => {
    const plan = buildPlan({ ...click, scheme: 'iso-2017', division: 5 });
    expect(targets(plan)).toEqual([60, 205, 340]);
    const times = new Set(
      plan.steps.map((s) => `${s.target}:${s.minLoadSeconds}-${s.maxLoadSeconds}`),
    );
    expect(times).toEqual(new Set(['340:1.5-null', '60:1-null', '205:1.5-null']));
  });
  it('iso-2017 times at their edges, N·m', () => {
    const least = (nominal: number) =>
      buildPlan({
        ...click,
        toolClass: 'II-B',
        range: { min: nominal, max: nominal },
        scheme: 'iso-2017',
      }).steps[0]?.minLoadSeconds;
    expect([9.99, 10, 99.9, 100, 999, 1000].map(least)).toEqual([0.5, 1, 1, 1.5, 1.5, 2]);
  });
  it('an indicating tool exercises once, a tool without a scale is read ten times', () => {
    expect(
      outline(buildPlan({ ...click, toolClass: 'I-C', range: { min: 0, max: 10 }, division: 0.1 })),
    ).toBe('e10cw r2cw r2cw r2cw r2cw r2cw r6cw r6cw r6cw r6cw r6cw r10cw r10cw r10cw r10cw r10cw');
    expect(buildPlan({ ...click, toolClass: 'II-C', division: null }).readingsPerPoint).toBe(10);
    expect(buildPlan({ ...click, toolClass: 'II-F', division: null }).readingsPerPoint).toBe(10);
  });
  it('a tool that shows from zero has its lowest point at 20 %', () => {
    const tool: PlanInput = {
      ...click,
      toolClass: 'I-C',
      range: { min: 0, max: 100 },
      scheme: 'iso-2017',
    };
    expect(targets(buildPlan({ ...tool, division: null }))).toEqual([20, 60, 100]);
    expect(targets(buildPlan({ ...tool, division: 0.1 }))).toEqual([20, 60, 100]);
  });
  it('starts each direction with its exercise pulls', () => {
    const plan = buildPlan({ ...click, scheme: 'short', directions: ['cw', 'ccw', 'cw'] });
    expect(outline(plan)).toBe(
      'e340cw e340cw e340cw r68cw r68cw r68cw r204cw r204cw r204cw r340cw r340cw r340cw ' +
        'e340ccw e340ccw e340ccw r68ccw r68ccw r68ccw r204ccw r204ccw r204ccw r340ccw r340ccw r340ccw',
    );
    expect(plan.isStandardSequence).toBe(false);
    expect(plan.departures).toHaveLength(1);
  });
  it('does not check one mark twice', () => {
    expect(targets(buildPlan({ ...click, range: { min: 90, max: 100 }, division: 5 }))).toEqual([
      90, 100,
    ]);
  });
});

describe('buildPlan, fixed tools and tools without a scale', () => {
  it('a fixed tool has its nominal value alone', () => {
    const plan = buildPlan({
      ...click,
      toolClass: 'II-B',
      range: { min: 100, max: 120 },
      nominal: 110,
    });
    expect(targets(plan)).toEqual([110]);
    expect(plan.steps).toHaveLength(10);
    expect(plan.steps.every((step) => step.target === 110)).toBe(true);
  });
  it('needs the nominal value, inside its range', () => {
    const fixed: PlanInput = { ...click, toolClass: 'II-E', range: { min: 1, max: 5 } };
    expect(() => buildPlan(fixed)).toThrow(/nominal value/);
    expect(() => buildPlan({ ...fixed, nominal: 6 })).toThrow(/above the tool’s range/);
    expect(() => buildPlan({ ...fixed, nominal: 0.5 })).toThrow(/below the tool’s range/);
  });
  it('a tool without a scale is checked where it was found set', () => {
    const plan = buildPlan({ ...click, toolClass: 'II-C', division: null, nominal: 137.5 });
    expect(targets(plan)).toEqual([137.5]);
    expect(plan.notes.join()).toContain('found set to');
  });
});

describe('buildPlan, working points', () => {
  const working: PlanInput = { ...click, scheme: 'working', workingPoints: [110, 70, 110] };
  it('sorts them, exercises at the highest and says so', () => {
    const plan = buildPlan(working);
    expect(targets(plan)).toEqual([70, 110]);
    expect(plan.steps.slice(0, 5).every((s) => s.kind === 'exercise' && s.target === 110)).toBe(
      true,
    );
    expect(plan.notes.join()).toContain('highest chosen point, 110 N·m');
    expect(plan.isStandardSequence).toBe(false);
  });
  it('goes to the nearest mark, and says so', () => {
    const plan = buildPlan({ ...working, division: 5, workingPoints: [112] });
    expect(targets(plan)).toEqual([110]);
    expect(plan.notes.join()).toContain('112 N·m lies between marks; 110 N·m is checked');
  });
  it('refuses points outside the range, and none', () => {
    expect(() => buildPlan({ ...working, workingPoints: [350] })).toThrow(
      /outside the tool’s range/,
    );
    expect(() => buildPlan({ ...working, workingPoints: [50] })).toThrow(RangeError);
    expect(() => buildPlan({ ...working, workingPoints: [] })).toThrow(RangeError);
    expect(() => buildPlan({ ...working, workingPoints: null })).toThrow(RangeError);
    expect(() => buildPlan({ ...working, workingPoints: [Number.NaN] })).toThrow(RangeError);
  });
});

describe('buildPlan, what a lead changes', () => {
  it('says what departs from the standard', () => {
    const plan = buildPlan({
      ...click,
      overrides: { exercisePulls: 2, readingsPerPoint: 4, percents: [30, 100] },
    });
    expect(targets(plan)).toEqual([102, 340]);
    expect(plan.steps).toHaveLength(2 + 8);
    expect(plan.isStandardSequence).toBe(false);
    expect(plan.departures).toEqual([
      'Set points at 30, 100 % of the maximum.',
      'Exercise pulls: 2 instead of 5.',
      'Readings a point: 4 instead of 5.',
    ]);
  });
  it('the standard’s own numbers are no change', () => {
    const overrides = { exercisePulls: 5, readingsPerPoint: null, percents: [20, 60, 100] };
    expect(buildPlan({ ...click, overrides })).toEqual(buildPlan(click));
  });
  it('refuses counts that are none', () => {
    expect(() => buildPlan({ ...click, overrides: { readingsPerPoint: 0 } })).toThrow(RangeError);
    expect(() => buildPlan({ ...click, overrides: { exercisePulls: 1.5 } })).toThrow(RangeError);
    expect(() => buildPlan({ ...click, overrides: { percents: [120] } })).toThrow(RangeError);
    expect(() => buildPlan({ ...click, overrides: { percents: [] } })).toThrow(RangeError);
  });
});

describe('buildPlan refuses', () => {
  it('to pull above the tester’s range, in any unit', () => {
    const tester = { minNm: 10, maxNm: 300 };
    expect(() => buildPlan({ ...click, testerRange: tester })).toThrow(
      '340 N·m is above the tester’s range, which ends at 300 N·m.',
    );
    const foot: PlanInput = { ...click, unit: 'lbf.ft', range: { min: 50, max: 250 } };
    expect(() => buildPlan({ ...foot, testerRange: tester })).toThrow(RangeError);
    expect(() => buildPlan({ ...foot, testerRange: { minNm: 10, maxNm: 500 } })).not.toThrow();
    const working: PlanInput = { ...click, scheme: 'working', workingPoints: [110] };
    expect(() => buildPlan({ ...working, testerRange: tester })).not.toThrow();
  });
  it('what makes no sense', () => {
    const bad = (change: Partial<PlanInput>) => () => buildPlan({ ...click, ...change });
    expect(bad({ range: { min: 340, max: 60 } })).toThrow(/above its upper end/);
    expect(bad({ range: { min: 61, max: 64 }, division: 10 })).toThrow(/No mark/);
    expect(bad({ range: { min: -1, max: 64 } })).toThrow(RangeError);
    expect(bad({ range: { min: 1, max: Number.NaN } })).toThrow(RangeError);
    expect(bad({ division: 0 })).toThrow(RangeError);
    expect(bad({ directions: [] })).toThrow(/needs a direction/);
    expect(bad({ guard: -1 })).toThrow(RangeError);
    expect(bad({ scheme: 'long' as PlanInput['scheme'] })).toThrow(/not known/);
    expect(bad({ unit: 'Nm' as PlanInput['unit'] })).toThrow(/not known/);
    expect(bad({ toolClass: 'II-H' as PlanInput['toolClass'] })).toThrow(/not known/);
    expect(bad({ basis: 'full' as PlanInput['basis'] })).toThrow(/not known/);
  });
});
