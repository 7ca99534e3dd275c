import { describe, expect, it } from 'vitest';
import { combine, coverageFactor, rectangular } from './uncertainty';

const part = (standard: number, dof: number) => ({ name: 'part', standard, dof });

describe('combine', () => {
  it('adds in squares', () => {
    const combined = combine([part(3, Infinity), part(4, Infinity)]);
    expect(combined.standard).toBe(5);
    expect(combined.effectiveDof).toBe(Infinity);
    expect(combined.coverageFactor).toBeCloseTo(2, 5);
    expect(combined.expanded).toBe(combined.coverageFactor * 5);
  });
  it.each([1, 2, 3, 4, 5, 9, 19, 49])('one component keeps its ν of %d', (dof) => {
    for (const standard of [0.1, 0.3, 1 / 3, 7e-200, 1e150]) {
      expect(combine([part(standard, dof)]).effectiveDof).toBe(dof);
    }
  });
  it('equal components have ν together, which rounding does not eat', () => {
    for (let count = 2; count <= 12; count += 1) {
      for (const dof of [1, 2, 3, 4, 9, 14]) {
        for (const standard of [0.1, 0.3, 1 / 3, 0.7]) {
          const parts = Array.from({ length: count }, () => part(standard, dof));
          // (n·u²)² / (n·u⁴/ν) = n·ν
          expect(combine(parts).effectiveDof).toBe(count * dof);
        }
      }
    }
  });
  it('truncates ν', () => {
    // (1 + 1)² / (1/4 + 1/5) = 8.89
    expect(combine([part(1, 4), part(1, 5)]).effectiveDof).toBe(8);
  });
  it('a type B component without size changes nothing', () => {
    const alone = combine([part(1, 4)]);
    expect(combine([part(1, 4), part(0, Infinity)])).toEqual(alone);
  });
  it('nothing uncertain has no uncertainty', () => {
    expect(combine([part(0, 4), part(0, Infinity)])).toMatchObject({
      standard: 0,
      effectiveDof: Infinity,
      expanded: 0,
    });
  });
  it('refuses bad input', () => {
    expect(() => combine([])).toThrow(RangeError);
    expect(() => combine([part(-1, 4)])).toThrow(RangeError);
    expect(() => combine([part(Number.NaN, 4)])).toThrow(RangeError);
    expect(() => combine([part(1, 0)])).toThrow(RangeError);
    expect(() => combine([part(1, Number.NaN)])).toThrow(RangeError);
    expect(() => combine([part(1, 4)], 1)).toThrow(RangeError);
    expect(() => combine([part(1, 4)], 0)).toThrow(RangeError);
  });
});

describe('coverageFactor', () => {
  it('falls towards the normal one', () => {
    const factors = [1, 2, 5, 20, 100, 1e4, Infinity].map((dof) => coverageFactor(dof));
    expect(factors).toEqual([...factors].sort((a, b) => b - a));
    expect(coverageFactor(Infinity)).toBeCloseTo(2.0000024, 6);
  });
});

describe('rectangular', () => {
  it('is the half-width over √3', () => {
    expect(rectangular(Math.sqrt(3))).toBe(1);
    expect(() => rectangular(-1)).toThrow(RangeError);
  });
});
