import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { relativeDeviation, summarise } from './deviation';

describe('relativeDeviation', () => {
  it('is positive on the reference basis when the tool says more than it delivers', () => {
    expect(relativeDeviation(102, 100)).toBe(2);
    expect(relativeDeviation(98, 100, 'reference')).toBe(-2);
  });
  it('has the other sign on the set basis', () => {
    expect(relativeDeviation(100, 102, 'set')).toBe(2);
    expect(relativeDeviation(100, 98, 'set')).toBe(-2);
  });
  it('the bases disagree near a limit: set 100, tester 104.10 at ±4 %', () => {
    expect(Math.abs(relativeDeviation(100, 104.1))).toBeLessThan(4);
    expect(Math.abs(relativeDeviation(100, 104.1, 'set'))).toBeGreaterThan(4);
  });
  it('refuses what has no deviation', () => {
    expect(() => relativeDeviation(100, 0)).toThrow(RangeError);
    expect(() => relativeDeviation(0, 100, 'set')).toThrow(RangeError);
    expect(() => relativeDeviation(-1, 100)).toThrow(RangeError);
    expect(() => relativeDeviation(100, -1)).toThrow(RangeError);
    expect(() => relativeDeviation(Number.NaN, 100)).toThrow(RangeError);
    expect(() => relativeDeviation(100, Infinity)).toThrow(RangeError);
    expect(() => relativeDeviation(100, 100, 'other' as 'set')).toThrow(RangeError);
  });
});

describe('summarise', () => {
  it('one value has no standard deviation', () => {
    expect(summarise([3])).toEqual({
      n: 1,
      mean: 3,
      standardDeviation: null,
      min: 3,
      max: 3,
      spread: 0,
    });
  });
  it('equal values have one of zero', () => {
    expect(summarise([0.1, 0.1, 0.1]).standardDeviation).toBe(0);
  });
  it('knows the extent', () => {
    expect(summarise([-1, 4, 2])).toMatchObject({ min: -1, max: 4, spread: 5 });
  });
  it('refuses an empty series and values that are none', () => {
    expect(() => summarise([])).toThrow(RangeError);
    expect(() => summarise([1, Number.NaN])).toThrow(RangeError);
  });
  it('does not mind an offset', () => {
    const values = fc.array(fc.integer({ min: -1000, max: 1000 }), { minLength: 2, maxLength: 20 });
    fc.assert(
      fc.property(values, (series) => {
        const plain = summarise(series);
        const moved = summarise(series.map((value) => value + 2 ** 40));
        expect(moved.standardDeviation).toBeCloseTo(plain.standardDeviation ?? NaN, 9);
        expect(moved.spread).toBe(plain.spread);
      }),
    );
  });
});
