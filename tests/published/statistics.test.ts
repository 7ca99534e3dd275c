import jstat from 'jstat';
import { describe, expect, it } from 'vitest';
import { summarise } from '@/lib/torque/deviation';

/** 1.2 on an offset, then 1.1 and 1.3 in turn, each `times` times, as decimal text reads. */
function numAcc(offset: number, times: number): number[] {
  const at = (tenths: number) => Number(`${offset + 1}.${tenths}`);
  const pairs = Array.from({ length: times }, () => [at(1), at(3)]).flat();
  return [at(2), ...pairs];
}

// Velocity of light, 299.xx and 300.xx, as hundredths above 299.
const michelson = `
  85 74 90 107 93 85 95 98 98 88 100 98 93 65 76 81 100 100 96 96 96 94 96 94 88 80 85 88 90 84
  83 79 81 88 88 83 80 79 76 80 88 88 88 86 72 72 62 86 97 95 88 91 85 87 84 84 85 84 84 84
  89 81 81 82 80 77 76 74 75 76 91 92 89 86 88 72 84 85 85 78 89 84 78 81 76 81 79 81 82 85
  87 87 81 74 81 94 95 80 81 87`;

// Optical transmittance, as ten-thousandths above 2.
const mavro = `
  18 17 18 19 18 17 15 14 15 15 17 18 18 19 19 21 20 16 14 13 13 15 15 16 15 14 13 14 15 14
  15 16 15 16 19 20 20 21 22 23 24 25 27 26 26 26 27 26 25 24`;

const listed = (text: string, value: (n: number) => number): number[] =>
  text
    .trim()
    .split(/\s+/)
    .map((word) => value(Number(word)));

describe('NIST StRD, univariate summary statistics: certified values', () => {
  it('NumAcc1', () => {
    const { mean, standardDeviation } = summarise([10000001, 10000003, 10000002]);
    expect(mean).toBe(10000002);
    expect(standardDeviation).toBe(1);
  });
  it('NumAcc2', () => {
    const { n, mean, standardDeviation } = summarise(numAcc(0, 500));
    expect(n).toBe(1001);
    expect(mean).toBeCloseTo(1.2, 14);
    expect(standardDeviation).toBeCloseTo(0.1, 14);
  });
  it('NumAcc3', () => {
    const { mean, standardDeviation } = summarise(numAcc(999999, 500));
    expect(mean).toBe(1000000.2);
    expect(standardDeviation).toBeCloseTo(0.1, 9);
  });
  it('NumAcc4', () => {
    const { mean, standardDeviation } = summarise(numAcc(9999999, 500));
    expect(mean).toBe(10000000.2);
    // The data themselves are rounded to 1.9e-9 at this size: no method gets further.
    expect(standardDeviation).toBeCloseTo(0.1, 8);
  });
  it('Michelso', () => {
    const values = listed(michelson, (n) => Number((299 + n / 100).toFixed(2)));
    const { n, mean, standardDeviation } = summarise(values);
    expect(n).toBe(100);
    expect(mean).toBeCloseTo(299.8524, 12);
    expect(standardDeviation).toBeCloseTo(0.0790105478190518, 13);
  });
  it('Mavro', () => {
    const values = listed(mavro, (n) => Number((2 + n / 10_000).toFixed(4)));
    const { n, mean, standardDeviation } = summarise(values);
    expect(n).toBe(50);
    expect(mean).toBeCloseTo(2.001856, 14);
    expect(standardDeviation).toBeCloseTo(0.000429123454003053, 15);
  });
});

describe('GUM (JCGM 100:2008) 4.4.3: twenty temperatures', () => {
  const temperatures = [
    96.9, 98.18, 98.25, 98.61, 99.03, 99.49, 99.56, 99.74, 99.89, 100.07, 100.33, 100.42, 100.68,
    100.95, 101.11, 101.2, 101.57, 101.84, 102.36, 102.72,
  ];
  const { n, mean, standardDeviation } = summarise(temperatures);
  it('mean, standard deviation and that of the mean, to the figures printed', () => {
    expect(mean.toFixed(3)).toBe('100.145');
    expect(standardDeviation?.toFixed(3)).toBe('1.489');
    expect(((standardDeviation ?? NaN) / Math.sqrt(n)).toFixed(3)).toBe('0.333');
  });
  it('jstat agrees', () => {
    expect(mean).toBeCloseTo(jstat.mean(temperatures), 10);
    expect(standardDeviation).toBeCloseTo(jstat.stdev(temperatures, true), 10);
  });
});
