import jstat from 'jstat';
import { describe, expect, it } from 'vitest';
import { combine, coverageFactor, rectangular } from '@/lib/torque/uncertainty';

describe('GUM (JCGM 100:2008) Table G.2: t for 95 % and 95.45 %', () => {
  it.each([
    [1, 12.71, 13.97],
    [2, 4.3, 4.53],
    [4, 2.78, 2.87],
    [10, 2.23, 2.28],
    [20, 2.09, 2.13],
    [50, 2.01, 2.05],
  ])('ν %d', (dof, at95, at9545) => {
    expect(coverageFactor(dof, 0.95)).toBeCloseTo(at95, 2);
    expect(coverageFactor(dof, 0.9545)).toBeCloseTo(at9545, 2);
  });
  it('ν infinite', () => {
    expect(coverageFactor(Infinity, 0.95)).toBeCloseTo(1.96, 3);
    expect(coverageFactor(Infinity, 0.9545)).toBeCloseTo(2, 3);
  });
});

describe('jstat, quantiles to 1e-6', () => {
  it.each([1, 2, 3, 4, 5, 9, 14, 29, 100])('Student’s t, ν %d', (dof) => {
    const oracle = jstat.studentt.inv((1 + 0.9545) / 2, dof);
    expect(Math.abs(coverageFactor(dof) / oracle - 1)).toBeLessThan(1e-6);
  });
  it('normal, for infinite ν', () => {
    const oracle = jstat.normal.inv((1 + 0.9545) / 2, 0, 1);
    expect(Math.abs(coverageFactor(Infinity) - oracle)).toBeLessThan(1e-7);
  });
});

describe('GUM G.4.1: three relative components', () => {
  const combined = combine(
    [
      { name: 'x1', standard: 0.25, dof: 9 },
      { name: 'x2', standard: 0.57, dof: 4 },
      { name: 'x3', standard: 0.82, dof: 14 },
    ],
    0.95,
  );
  it('u 1.03 %, U95 2.2 %, as published', () => {
    expect(combined.standard.toFixed(2)).toBe('1.03');
    expect(combined.expanded.toFixed(1)).toBe('2.2');
  });
  it('ν: published 19, from u rounded to 1.03; unrounded the formula gives 18.9987, truncated 18', () => {
    const below = 0.25 ** 4 / 9 + 0.57 ** 4 / 4 + 0.82 ** 4 / 14;
    expect(1.03 ** 4 / below).toBeCloseTo(19.04, 2);
    expect(1.0598 ** 2 / below).toBeCloseTo(18.9987, 4);
    expect(combined.effectiveDof).toBe(18);
    // Either way t is 2.1 and the published U stands.
    expect(coverageFactor(19, 0.95).toFixed(2)).toBe('2.09');
    expect(coverageFactor(18, 0.95).toFixed(2)).toBe('2.10');
  });
});

describe('GUM H.1: end gauge, in nm', () => {
  it('u_c 32, ν 16, k99 2.92, U99 93', () => {
    const combined = combine(
      [
        { name: 'standard', standard: 25, dof: 18 },
        { name: 'difference', standard: 9.7, dof: 25.6 },
        { name: 'expansion', standard: 2.9, dof: 50 },
        { name: 'temperature', standard: 16.6, dof: 2 },
      ],
      0.99,
    );
    expect(Math.round(combined.standard)).toBe(32);
    expect(combined.effectiveDof).toBe(16);
    expect(combined.coverageFactor.toFixed(2)).toBe('2.92');
    // GUM prints 2.92 · 32 = 93; with u not rounded it is 92.6.
    expect(Math.round(combined.expanded)).toBe(93);
  });
});

describe('GUM 4.3.7 and F.2.2.1: rectangular distribution', () => {
  it('resolution δx has u = 0.29 δx', () => {
    expect(rectangular(0.5).toFixed(2)).toBe('0.29');
  });
});
