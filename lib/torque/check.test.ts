import normalCdf from '@stdlib/stats-base-dists-normal-cdf';
import { describe, expect, it } from 'vitest';
import { evaluateCheck } from './check';
import { factsOf, pulled, pullOf, referenceFor } from './check.fixture';
import { delivered } from './delivered';
import type { CheckFacts, PullFact } from './facts';

const first = (facts: CheckFacts) => {
  const point = evaluateCheck(facts).points[0];
  if (!point) throw new Error('no point');
  return point;
};

it('says which points were pulled again after a later one', () => {
  const whole = pulled(factsOf());
  const again = evaluateCheck({
    ...whole,
    pulls: [
      ...whole.pulls.map((pull) =>
        pull.stepIndex === 3
          ? { ...pull, state: 'voided' as const, fault: 'slipped' as const }
          : pull,
      ),
      pullOf(whole, 3, { id: 'again', sequence: 99 }),
    ],
  });
  expect(again.missing).toEqual([]);
  expect(again.notFollowed).toContain('68 N·m clockwise was pulled again after a later set point.');
  expect(evaluateCheck(whole).notFollowed.join()).not.toContain('again');
  // Within its own set point a pull that is repeated breaks no order.
  const six = pulled(factsOf(), 5);
  const inPlace = [
    ...six.pulls.filter((pull) => pull.stepIndex !== 3),
    pullOf(six, 3, { sequence: 99 }),
  ];
  expect(evaluateCheck({ ...six, pulls: inPlace }).notFollowed.join()).not.toContain('again');
});

describe('evaluateCheck, worked out by hand', () => {
  // Three exercise pulls, then three readings at 68 N·m.
  const facts = pulled(factsOf(), 6, (_, step) => [0, 0, 0, 69.0, 69.2, 69.4][step] || 340);
  const point = first(facts);

  it('deviations 100·(68 − x)/x', () => {
    expect(point.readings.map((reading) => reading.deviation.toFixed(4))).toEqual([
      '-1.4493',
      '-1.7341',
      '-2.0173',
    ]);
    expect(point.summary?.mean).toBeCloseTo(-1.733557, 6);
    expect(point.summary?.standardDeviation).toBeCloseTo(0.284008, 6);
  });
  it('reference: √(0.25² + (0.1/√3)² + 2·(0.07353/√3)²) = 0.26351, ·2 + 0.2 = 0.72702', () => {
    expect(point.referenceExpanded).toBeCloseTo(0.727022, 5);
    expect(point.guardPercent).toBeCloseTo(0.727022, 5);
    expect(point.testUncertaintyRatio).toBeCloseTo(4 / 0.727022, 4);
  });
  it('budget: with the division 0.42452 and s/√3 = 0.16397, u 0.52587, ν 211', () => {
    expect(point.budget?.components.map(({ name }) => name)).toEqual([
      'certificate',
      'drift',
      'resolution-reading',
      'resolution-zero',
      'division',
      'repeatability',
    ]);
    const standards = point.budget?.components.map(({ standard }) => Number(standard.toFixed(5)));
    expect(standards).toEqual([0.25, 0.05774, 0.04245, 0.04245, 0.42452, 0.16397]);
    expect(point.budget?.combined.standard).toBeCloseTo(0.525874, 6);
    expect(point.budget?.combined.effectiveDof).toBe(211);
    expect(point.budget?.uncorrectedErrorPercent).toBe(0.2);
  });
  it('delivers the mean, with the expanded uncertainty and the uncorrected error', () => {
    const { combined } = point.budget ?? { combined: { expanded: NaN } };
    expect(point.meanDelivered?.valueNm).toBeCloseTo(69.2, 12);
    expect(point.meanDelivered?.expandedNm).toBeCloseTo(
      (69.2 * (combined.expanded + 0.2)) / 100,
      12,
    );
  });
  it('conformance of the mean at a limit it touches, u widened by 0.2/k', () => {
    const edge = first(
      pulled(factsOf(), 6, (target, step) => referenceFor(target, step === 4 ? 3.4 : 3.6)),
    );
    const { combined } = edge.budget ?? { combined: { standard: NaN, coverageFactor: NaN } };
    const standard = combined.standard + 0.2 / combined.coverageFactor;
    const z = (4 - (edge.summary?.mean ?? NaN)) / standard;
    expect(edge.conformance).toBeCloseTo(normalCdf(z, 0, 1), 9);
    expect(z).toBeGreaterThan(0.5);
    expect(z).toBeLessThan(1);
  });
  it('says what is not in the budget', () => {
    const words = point.notAssessed.join(' ');
    for (const name of ['temperature', 'sampling', 'Reproducibility', 'Loading point']) {
      expect(words).toContain(name);
    }
  });
  it('within at this point, the rest not judged yet', () => {
    const { verdict, points } = evaluateCheck(facts);
    expect(points.map((one) => one.verdict)).toEqual(['within', 'not-judged', 'not-judged']);
    expect(points[1]?.reasons).toEqual([{ code: 'no-readings', words: 'no readings yet' }]);
    expect(verdict).toBe('not-judged');
    expect(point.conformance).toBeGreaterThan(0.99);
  });
});

describe('evaluateCheck, the components that need to be known', () => {
  const known = factsOf();
  const facts = pulled({
    ...known,
    temperatureC: 29,
    tester: {
      ...known.tester,
      temperatureCoefficientPercentPerK: 0.02,
      slopeNmPerSecond: 200,
      samplePeriodSeconds: 0.001,
    },
  });
  const standard = (name: string) =>
    first(facts).budget?.components.find((component) => component.name === name)?.standard;
  it('temperature 0.02 · 8 K and sampling 0.2 N·m of 68, both rectangular', () => {
    expect(standard('temperature')).toBeCloseTo(0.16 / Math.sqrt(3), 12);
    expect(standard('sampling')).toBeCloseTo((100 * 0.2) / 68 / Math.sqrt(3), 12);
    expect(first(facts).notAssessed.join()).not.toMatch(/temperature|sampling/);
  });
  it('a corrected error is not added, and the correction counts', () => {
    const corrected: CheckFacts = {
      ...facts,
      tester: { ...facts.tester, correctionApplied: true },
      pulls: facts.pulls.map((pull) => ({ ...pull, correctionNm: -1 })),
    };
    expect(first(corrected).budget?.uncorrectedErrorPercent).toBe(0);
    const uncorrected = first(facts).referenceExpanded ?? NaN;
    expect(first(corrected).referenceExpanded).toBeCloseTo(uncorrected - 0.2, 12);
    expect(first(corrected).readings[0]?.referenceNm).toBe(67);
  });
  it('the division and the scatter are no part of the reference', () => {
    const wide = { ...facts, tool: { ...facts.tool, division: 20 } };
    const scattered = pulled(wide, undefined, (targetNm, step) => targetNm + (step % 3));
    expect(first(scattered).referenceExpanded).toBe(first(facts).referenceExpanded);
  });
  it('no reading moves the guard band that it is judged with', () => {
    const far = pulled(facts, undefined, (targetNm) => 0.7 * targetNm);
    expect(first(far).guardPercent).toBe(first(facts).guardPercent);
  });
});

describe('evaluateCheck, verdicts in words', () => {
  const whole = (input: Parameters<typeof factsOf>[0], deviation: (target: number) => number) =>
    evaluateCheck(
      pulled(factsOf(input), undefined, (targetNm) => referenceFor(targetNm, deviation(targetNm))),
    );
  it('the whole standard sequence may say within alone', () => {
    const evaluation = whole({ scheme: 'iso-2003' }, () => 1);
    expect(evaluation).toMatchObject({
      verdict: 'within',
      simpleVerdict: 'within',
      statement: 'Within tolerance',
      nextStepIndex: null,
      missing: [],
      notFollowed: [],
      progress: { done: 20, total: 20 },
    });
  });
  it('a short, working or changed one says where', () => {
    expect(whole({}, () => 1).statement).toBe('Within at 68, 204 and 340 N·m (short check)');
    expect(whole({ scheme: 'working', workingPoints: [110, 70] }, () => 1).statement).toBe(
      'Within at 70 and 110 N·m (working points)',
    );
    const overrides = { readingsPerPoint: 2 };
    const changed = whole({ scheme: 'iso-2003', overrides }, () => 1);
    expect(changed.statement).toBe('Within at 68, 204 and 340 N·m (changed sequence)');
    expect(changed.notFollowed).toEqual(['Readings a point: 2 instead of 5.']);
  });
  it('outside and too close say at which points', () => {
    const outside = whole({ scheme: 'iso-2003' }, (target) => (target < 300 ? 1 : 6));
    expect(outside).toMatchObject({ verdict: 'outside', statement: 'Outside at 340 N·m' });
    expect(outside.points[2]?.readings.every((reading) => reading.beyond)).toBe(true);
    const close = whole({ scheme: 'iso-2003' }, (target) => (target < 100 ? 3.8 : 1));
    expect(close).toMatchObject({
      verdict: 'too-close',
      simpleVerdict: 'within',
      statement: 'Too close to call at 68 N·m',
    });
  });
  it('counter-clockwise is always named', () => {
    const directions = ['cw', 'ccw'] as const;
    const facts = pulled(factsOf({ directions }));
    const ccw = facts.tester.points.map((point) => ({ ...point, direction: 'ccw' as const }));
    const points = [...facts.tester.points, ...ccw];
    expect(evaluateCheck({ ...facts, tester: { ...facts.tester, points } }).statement).toBe(
      'Within at 68, 204 and 340 N·m clockwise and 68, 204 and 340 N·m counter-clockwise (short check)',
    );
    const uncertified = evaluateCheck(facts);
    expect(uncertified.points[3]?.reasons.map(({ code }) => code)).toEqual([
      'outside-certified-range',
    ]);
    expect(uncertified.points[3]?.meanDelivered).toBeNull();
  });
  it('barred says why', () => {
    const facts = pulled(factsOf({}, { barred: ['not-proved-today'] }));
    expect(evaluateCheck(facts)).toMatchObject({
      verdict: 'not-judged',
      statement: 'Not judged: the tester was not proved today (short check)',
    });
  });
  it('a point below the claimed range is shown and not counted', () => {
    const tool = {
      ...factsOf().tool,
      claim: { of: 'reading' as const, cwPercent: 3, ccwPercent: null, fromPercent: 50 },
    };
    const evaluation = evaluateCheck({ ...pulled(factsOf({ scheme: 'iso-2003' })), tool });
    expect(evaluation.points.map((point) => point.excluded)).toEqual([true, false, false]);
    expect(evaluation.points[0]).toMatchObject({ verdict: 'not-judged', limits: null });
    expect(evaluation.points[0]?.standardLimits.upper).toBe(4);
    expect(evaluation.points[1]?.limits).toEqual({ lower: -3, upper: 3, source: 'claim' });
    expect(evaluation.verdict).toBe('within');
    expect(evaluation.statement).toBe(
      'Within at 204 and 340 N·m; 68 N·m below the claimed range, not counted',
    );
  });
  it('set basis: set 100, tester 104.10 is outside there and inside by ISO', () => {
    const at = (basis: 'reference' | 'set') =>
      evaluateCheck(
        pulled(
          factsOf({ scheme: 'working', workingPoints: [100], basis, guard: 0 }),
          undefined,
          () => 104.1,
        ),
      ).verdict;
    expect(at('reference')).toBe('within');
    expect(at('set')).toBe('outside');
  });
});

describe('evaluateCheck, in the middle of a check', () => {
  it('before the first pull', () => {
    const evaluation = evaluateCheck(factsOf());
    expect(evaluation).toMatchObject({
      verdict: 'not-judged',
      statement: 'Not judged: no readings yet (short check)',
      nextStepIndex: 0,
      progress: { done: 0, total: 12 },
    });
    expect(evaluation.missing[0]).toBe('exercise pull 1 of 3 clockwise');
    expect(evaluation.missing[3]).toBe('reading 1 of 3 at 68 N·m clockwise');
    expect(evaluation.points[0]?.guardPercent).toBeCloseTo(0.727022, 5);
    expect(evaluation.delivered).toEqual([{ direction: 'cw', points: [] }]);
  });
  it('can be called after every pull', () => {
    const facts = factsOf({ scheme: 'iso-2003' });
    for (let count = 0; count <= facts.plan.steps.length; count += 1) {
      const evaluation = evaluateCheck(pulled(facts, count));
      expect(evaluation.progress.done).toBe(count);
      expect(evaluation.nextStepIndex).toBe(count < 20 ? count : null);
      expect(evaluation.missing).toHaveLength(20 - count);
    }
  });
  it('one reading has no scatter, and says so', () => {
    const point = first(pulled(factsOf(), 4));
    expect(point.summary?.standardDeviation).toBeNull();
    expect(point.budget?.components.some(({ name }) => name === 'repeatability')).toBe(false);
    expect(point.notAssessed).toContain('Repeatability: there is one reading only.');
    expect(point).toMatchObject({ verdict: 'not-judged', reasons: [{ code: 'readings-missing' }] });
  });
  it('an offered value holds its step and counts nowhere', () => {
    const facts = pulled(factsOf(), 4);
    const offered = pullOf(facts, 4, { state: 'offered', rawNm: 10 });
    const evaluation = evaluateCheck({ ...facts, pulls: [...facts.pulls, offered] });
    expect(evaluation.nextStepIndex).toBe(5);
    expect(evaluation.points[0]?.readings).toHaveLength(1);
    expect(evaluation.missing[0]).toBe('reading 2 of 3 at 68 N·m clockwise (waits to be accepted)');
    expect(evaluation.progress.done).toBe(4);
  });
  it('a voided value is shown with its fault, and its step is open again', () => {
    const facts = pulled(factsOf());
    const voided: PullFact = pullOf(facts, 3, {
      id: 'bad',
      state: 'voided',
      fault: 'slipped',
      rawNm: 0,
    });
    const others = facts.pulls.filter((pull) => pull.stepIndex !== 3);
    const open = evaluateCheck({ ...facts, pulls: [...others, voided] });
    expect(open.nextStepIndex).toBe(3);
    expect(open.points[0]?.voided).toEqual([
      {
        pullId: 'bad',
        toolValue: 68,
        referenceNm: 0,
        deviation: null,
        fault: 'slipped',
        note: null,
      },
    ]);
    expect(open.points[0]?.readings).toHaveLength(2);
    const again = evaluateCheck({ ...facts, pulls: [voided, ...facts.pulls] });
    expect(again.verdict).toBe('within');
    expect(again.points[0]?.voided).toHaveLength(1);
  });
  it('exercise pulls need no value, and are asked for', () => {
    const facts = pulled(factsOf());
    const unread = facts.pulls.map((pull) =>
      pull.stepIndex < 3 ? { ...pull, rawNm: null } : pull,
    );
    expect(evaluateCheck({ ...facts, pulls: unread }).verdict).toBe('within');
    const skipped = evaluateCheck({ ...facts, pulls: facts.pulls.slice(1) });
    expect(skipped.verdict).toBe('not-judged');
    expect(skipped.statement).toBe('Not judged: exercise pulls are missing (short check)');
    expect(skipped.missing).toEqual(['exercise pull 1 of 3 clockwise']);
  });
  it('stopped early says so, with what was left', () => {
    const facts: CheckFacts = {
      ...pulled(factsOf(), 10),
      stoppedEarly: true,
      stopReason: 'The owner had to leave.',
      temperatureC: 14,
    };
    expect(evaluateCheck(facts).notFollowed).toEqual([
      'Short check: fewer pulls than the standard’s sequence.',
      'Stopped early, 2 pulls not made: The owner had to leave.',
      'Ambient temperature 14 °C, outside 18 to 28 °C.',
    ]);
    const unknown = evaluateCheck({ ...facts, temperatureC: null, stoppedEarly: false });
    expect(unknown.notFollowed).toContain('The ambient temperature was not recorded.');
  });
  it('refuses a pull of no step, and a reading of nothing', () => {
    const facts = factsOf();
    expect(() => evaluateCheck({ ...facts, pulls: [pullOf(facts, 99)] })).toThrow(RangeError);
    expect(() => evaluateCheck({ ...facts, pulls: [pullOf(facts, 4, { rawNm: 0 })] })).toThrow(
      RangeError,
    );
  });
});

describe('evaluateCheck, a tool that does not let go', () => {
  const stuckAt = (rawNm: number | null) => {
    const facts = pulled(factsOf(), 4);
    const stuck = pullOf(facts, 4, { outcome: 'no-release', rawNm });
    return evaluateCheck({ ...facts, pulls: [...facts.pulls, stuck] });
  };
  it('is outside there, with the torque, and is not pulled there again', () => {
    const evaluation = stuckAt(88.4);
    expect(evaluation.points[0]).toMatchObject({
      verdict: 'outside',
      simpleVerdict: 'outside',
      noRelease: true,
      noReleaseNm: 88.4,
      reasons: [{ code: 'no-release', words: 'the tool did not let go' }],
    });
    expect(evaluation.points[0]?.readings).toHaveLength(1);
    expect(evaluation.nextStepIndex).toBe(6);
    expect(evaluation.progress.done).toBe(6);
    expect(evaluation.missing).toHaveLength(6);
    expect(evaluation.notFollowed).toContain(
      'No further readings at 68 N·m clockwise: the tool had not let go.',
    );
  });
  it('stopped inside the limits, below the target, or at no stated torque, proves nothing', () => {
    for (const rawNm of [69, 40, null]) {
      const point = stuckAt(rawNm).points[0];
      expect(point?.verdict).toBe('not-judged');
      expect(point?.reasons.map(({ code }) => code)).toContain('no-release-unproven');
    }
  });
});

describe('evaluateCheck, indicating tools and other units', () => {
  it('takes what the display showed, in the tool’s unit', () => {
    const facts = factsOf({
      toolClass: 'I-C',
      unit: 'lbf.ft',
      range: { min: 50, max: 250 },
      division: 0.1,
    });
    // The display says 51.0 while the tester has 50 lbf·ft: 2 % too much.
    const shown = pullOf(facts, 1, { toolValue: 51, rawNm: 50 * 1.3558179483314004 });
    const point = first({ ...facts, pulls: [pullOf(facts, 0), shown] });
    expect(point.target).toBe(50);
    expect(point.readings[0]?.deviation).toBeCloseTo(2, 12);
    // At a display of 50 it delivers 50/1.02.
    expect(point.meanDelivered?.valueNm).toBeCloseTo((50 * 1.3558179483314004) / 1.02, 9);
    expect(point.notAssessed.join()).not.toContain('sampling');
  });
  it('gives the points from which any setting follows', () => {
    const evaluation = evaluateCheck(pulled(factsOf(), undefined, (targetNm) => 0.98 * targetNm));
    const points = evaluation.delivered[0]?.points ?? [];
    expect(delivered(points, 100)?.valueNm).toBeCloseTo(98, 9);
    expect(delivered(points, 341)).toBeNull();
  });
});
