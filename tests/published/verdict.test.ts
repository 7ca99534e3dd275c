import normalCdf from '@stdlib/stats-base-dists-normal-cdf';
import jstat from 'jstat';
import { describe, expect, it } from 'vitest';
import { conformanceProbability, extensionTorque, judgePoint } from '@/lib/torque/verdict';

describe('JCGM 106:2012, conformance probability', () => {
  it('one limit: 0.92', () => {
    const p = conformanceProbability({ value: -5.47, standard: 0.05, upper: -5.4 });
    expect(p.toFixed(2)).toBe('0.92');
  });
  it('two limits: 0.66', () => {
    const p = conformanceProbability({ value: 13.6, standard: 1.8, lower: 12.5, upper: 16.3 });
    expect(p.toFixed(2)).toBe('0.66');
  });
  it.each([-6, -3.2, -1, 0, 0.4, 2.9, 5])('jstat and @stdlib agree at %d', (value) => {
    const p = conformanceProbability({ value, standard: 0.7, lower: -4, upper: 4 });
    const by = (cdf: (x: number, mean: number, sd: number) => number) =>
      cdf(4, value, 0.7) - cdf(-4, value, 0.7);
    expect(p).toBeCloseTo(by(jstat.normal.cdf), 8);
    expect(p).toBeCloseTo(by(normalCdf), 12);
  });
});

describe('ILAC-G8:09/2019: one-sided risk at the acceptance limit with w = r·U (computed)', () => {
  // U = 2u, tolerance limit 4, reading exactly on the acceptance limit.
  const expanded = 0.5;
  it.each([
    [0, 0.5, 4],
    [0.5, 0.1587, 4],
    [0.83, 0.0485, 4],
    [1, 0.02275, 5],
    [1.5, 0.00135, 5],
  ])('r %d: risk %d', (guard, risk, figures) => {
    const limits = { lower: -4, upper: 4 };
    const onLimit = 4 - guard * expanded;
    expect(
      judgePoint({ deviations: [onLimit], limits, referenceExpanded: expanded, guard }),
    ).toMatchObject({ verdict: 'within' });
    const conforming = conformanceProbability({ value: onLimit, standard: expanded / 2, upper: 4 });
    expect(1 - conforming).toBeCloseTo(risk, figures);
  });
});

describe('US military and Navy course manuals: extension in line with the tool', () => {
  it('set 60, length 12, extension 2: 70', () => {
    expect(extensionTorque({ settingNm: 60, lengthM: 12, extensionM: 2 })).toBe(70);
  });
  it('for 100 at the end with 12 and 6 the tool is set to 66.7', () => {
    expect(extensionTorque({ settingNm: 200 / 3, lengthM: 12, extensionM: 6 })).toBeCloseTo(
      100,
      12,
    );
    expect((100 / extensionTorque({ settingNm: 1, lengthM: 12, extensionM: 6 })).toFixed(1)).toBe(
      '66.7',
    );
  });
  it('for 300 at the end with 10 and 4 the tool is set to 214', () => {
    expect((300 / extensionTorque({ settingNm: 1, lengthM: 10, extensionM: 4 })).toFixed(0)).toBe(
      '214',
    );
  });
});
