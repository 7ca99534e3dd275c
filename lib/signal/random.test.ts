import { describe, expect, it } from 'vitest';
import { mulberry32, standardNormal } from './random';
import { simulateDelivered } from './simulated-tool';

const draw = (count: number, next: () => number) => Array.from({ length: count }, next);
const meanOf = (values: number[]) => values.reduce((sum, value) => sum + value, 0) / values.length;
const deviationOf = (values: number[]) => {
  const mean = meanOf(values);
  return Math.sqrt(meanOf(values.map((value) => (value - mean) ** 2)));
};

describe('mulberry32', () => {
  it('gives the same numbers for the same seed, others for another', () => {
    const first = draw(50, mulberry32(7));
    expect(draw(50, mulberry32(7))).toEqual(first);
    expect(draw(50, mulberry32(8))).not.toEqual(first);
    expect(first.every((value) => value >= 0 && value < 1)).toBe(true);
  });

  it('is even: mean 1/2, standard deviation 1/√12', () => {
    const values = draw(50_000, mulberry32(3));
    expect(meanOf(values)).toBeCloseTo(0.5, 2);
    expect(deviationOf(values)).toBeCloseTo(1 / Math.sqrt(12), 2);
  });

  it('refuses a seed that is not a whole number', () => {
    expect(() => mulberry32(0.5)).toThrow(RangeError);
    expect(() => mulberry32(Number.NaN)).toThrow(RangeError);
  });
});

describe('standardNormal', () => {
  it('has mean 0, standard deviation 1, and 68.3 % within one of it', () => {
    const random = mulberry32(11);
    const values = draw(50_000, () => standardNormal(random));
    expect(Math.abs(meanOf(values))).toBeLessThan(0.02);
    expect(Math.abs(deviationOf(values) - 1)).toBeLessThan(0.02);
    const within = values.filter((value) => Math.abs(value) < 1).length / values.length;
    expect(Math.abs(within - 0.6827)).toBeLessThan(0.01);
  });
});

describe('simulateDelivered', () => {
  it('gives a tool its bias as ISO 6789 counts it', () => {
    // 100·(104 − x_r)/x_r = 4 → x_r = 100
    expect(simulateDelivered(104, { biasPercent: 4, scatterPercent: 0 }, mulberry32(1))).toBe(100);
  });

  it('scatters by the standard deviation asked for', () => {
    const random = mulberry32(5);
    const tool = { biasPercent: -1, scatterPercent: 0.5 };
    const deviations = draw(20_000, () => (100 / simulateDelivered(100, tool, random) - 1) * 100);
    expect(meanOf(deviations)).toBeCloseTo(-1, 1);
    expect(deviationOf(deviations)).toBeCloseTo(0.5, 1);
  });

  it.each([0, -5, Number.NaN, Infinity])('refuses a torque of %s', (torqueNm) => {
    const tool = { biasPercent: 0, scatterPercent: 0 };
    expect(() => simulateDelivered(torqueNm, tool, mulberry32(1))).toThrow(RangeError);
  });
});
