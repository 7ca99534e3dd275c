import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { corridorExtent, layoutCorridor, type CorridorMetrics } from './geometry';
import type { CorridorRow } from './types';

const metrics: CorridorMetrics = { plotWidthPx: 200, dotRadiusPx: 5, swarmHeightPx: 30 };

function row(deviations: number[], change: Partial<CorridorRow> = {}): CorridorRow {
  return {
    label: '60',
    unitLabel: 'N·m',
    lower: -4,
    upper: 4,
    guardPercent: 0.7,
    readings: deviations.map((deviation) => ({ deviation, beyond: Math.abs(deviation) > 4 })),
    mean: deviations.length > 0 ? deviations.reduce((a, b) => a + b, 0) / deviations.length : null,
    meanExpanded: deviations.length > 0 ? 0.5 : null,
    ...change,
  };
}

const only = (rows: CorridorRow[], basis: 'reference' | 'set' = 'set') => {
  const layout = layoutCorridor(rows, basis, metrics).rows[0];
  if (layout === undefined) throw new Error('no row');
  return layout;
};

describe('corridorExtent', () => {
  it('grows in steps of the widest limit', () => {
    expect(corridorExtent([row([])])).toBeCloseTo(5.6);
    expect(corridorExtent([row([5.2])])).toBeCloseTo(5.6);
    expect(corridorExtent([row([-5.9])])).toBeCloseTo(7.2);
    expect(corridorExtent([row([8])])).toBeCloseTo(9.6);
    expect(corridorExtent([row([40])])).toBeCloseTo(9.6);
  });

  it('takes the widest limit of all rows', () => {
    expect(corridorExtent([row([]), row([], { lower: -6, upper: 5 })])).toBeCloseTo(8.4);
  });

  it('is scaled by the readings when no row has limits', () => {
    expect(corridorExtent([row([9], { lower: null, upper: null })])).toBeCloseTo(9.9);
    expect(corridorExtent([row([], { lower: null, upper: null })])).toBe(5);
  });
});

describe('layoutCorridor', () => {
  it('puts delivers less on the left on either basis', () => {
    // Set 100, tester 98: less. Reference basis +2.04 %, set basis −2 %.
    expect(only([row([2.04])], 'reference').marks[0]?.at).toBeLessThan(0.5);
    expect(only([row([-2])], 'set').marks[0]?.at).toBeLessThan(0.5);
  });

  it('keeps the limits in their own sign, left one first', () => {
    const reference = only([row([], { lower: -3.85, upper: 4.17 })], 'reference');
    expect(reference.limits.map((limit) => limit.value)).toEqual([4.17, -3.85]);
    const set = only([row([], { lower: -3.85, upper: 4.17 })], 'set');
    expect(set.limits.map((limit) => limit.value)).toEqual([-3.85, 4.17]);
  });

  it('places zero in the middle, limits and mean by scale', () => {
    const layout = only([row([-2.8, -2.8])]);
    expect(layout.limits[0]?.at).toBeCloseTo(0.5 - 4 / 11.2);
    expect(layout.mean?.at).toBeCloseTo(0.25);
    expect(layout.mean?.from).toBeCloseTo(0.5 - 3.3 / 11.2);
    expect(layout.mean?.to).toBeCloseTo(0.5 - 2.3 / 11.2);
  });

  it('hatches the guard on both sides of each limit', () => {
    const { guards } = only([row([])]);
    expect(guards[0]?.from).toBeCloseTo(0.5 - 4.7 / 11.2);
    expect(guards[0]?.to).toBeCloseTo(0.5 - 3.3 / 11.2);
    expect(guards[1]?.from).toBeCloseTo(0.5 + 3.3 / 11.2);
    expect(only([row([], { guardPercent: 0 })]).guards).toEqual([]);
  });

  it('lets wide guards meet in the middle and not cross', () => {
    const { guards } = only([row([], { guardPercent: 6 })]);
    expect(guards[0]?.to).toBeCloseTo(0.5);
    expect(guards[1]?.from).toBeCloseTo(0.5);
  });

  it('shows a reading past the axis as an arrow at its edge', () => {
    const [left, right, inside] = only([row([-30, 30, 1])]).marks;
    expect(left).toMatchObject({ pastEdge: 'left', beyond: true, at: 0.025 });
    expect(right).toMatchObject({ pastEdge: 'right', at: 0.975 });
    expect(inside?.pastEdge).toBeNull();
  });

  it('has an empty band before the first reading', () => {
    const layout = only([row([])]);
    expect(layout.band).not.toBeNull();
    expect(layout.marks).toEqual([]);
    expect(layout.mean).toBeNull();
  });

  it('has no band where no tolerance applies', () => {
    const layout = only([row([1], { lower: null, upper: null, guardPercent: null })]);
    expect(layout).toMatchObject({ band: null, guards: [], limits: [] });
    expect(layout.marks).toHaveLength(1);
  });

  it('knows whether one axis serves all rows', () => {
    expect(layoutCorridor([row([]), row([])], 'set', metrics).sharedLimits).toBe(true);
    const differing = [row([]), row([], { lower: -6, upper: 6 })];
    expect(layoutCorridor(differing, 'set', metrics).sharedLimits).toBe(false);
  });

  it('refuses what is not a number', () => {
    expect(() => layoutCorridor([row([Number.NaN])], 'set', metrics)).toThrow(RangeError);
  });

  it('keeps every mark on the plot, in reading order, whatever the readings', () => {
    const percent = fc.double({ min: -60, max: 60, noNaN: true });
    fc.assert(
      fc.property(fc.array(percent, { maxLength: 12 }), fc.boolean(), (deviations, isSet) => {
        const { marks } = only([row(deviations)], isSet ? 'set' : 'reference');
        expect(marks).toHaveLength(deviations.length);
        for (const mark of marks) {
          expect(mark.at).toBeGreaterThanOrEqual(0);
          expect(mark.at).toBeLessThanOrEqual(1);
          expect(Math.abs(mark.offsetPx)).toBeLessThanOrEqual(metrics.swarmHeightPx / 2);
        }
      }),
    );
  });
});
