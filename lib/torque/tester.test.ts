import { describe, expect, it } from 'vitest';
import { certificateAt, correctionNm, type CertificatePoint } from './tester';

const point = (
  direction: 'cw' | 'ccw',
  torqueNm: number,
  errorPercent: number,
  expandedPercent: number,
  k = 2,
): CertificatePoint => ({ direction, torqueNm, errorPercent, expandedPercent, k });

// In no order, as a person may type them.
const points = [
  point('cw', 500, -0.1, 0.2),
  point('cw', 50, 0.3, 0.6),
  point('cw', 100, 0.2, 0.4),
  point('ccw', 100, 1, 1, 2.2),
  point('ccw', 200, 2, 0.5, 2),
];
const at = (direction: 'cw' | 'ccw', torqueNm: number) =>
  certificateAt({ points, direction, torqueNm });

describe('certificateAt', () => {
  it('is the certified point where there is one, at both ends too', () => {
    expect(at('cw', 50)).toEqual({ errorPercent: 0.3, expandedPercent: 0.6, k: 2 });
    expect(at('cw', 500)).toEqual({ errorPercent: -0.1, expandedPercent: 0.2, k: 2 });
    expect(at('cw', 500 * (1 + 1e-12))).not.toBeNull();
  });
  it('is linear in between, in the pull’s direction', () => {
    expect(at('cw', 75)?.errorPercent).toBeCloseTo(0.25, 12);
    expect(at('cw', 300)?.expandedPercent).toBeCloseTo(0.3, 12);
    expect(at('ccw', 150)?.errorPercent).toBeCloseTo(1.5, 12);
    expect(at('ccw', 150)?.k).toBeCloseTo(2.1, 12);
  });
  it('gives the standard uncertainty between those of its points, whatever their coverage', () => {
    // (1/2.2 + 0.5/2)/2 = 0.3522727
    const { expandedPercent, k } = at('ccw', 150) ?? { expandedPercent: NaN, k: NaN };
    expect(expandedPercent / k).toBeCloseTo(0.3522727, 7);
  });
  it('is null outside the certified range and in a direction without points', () => {
    expect(at('cw', 49.9)).toBeNull();
    expect(at('cw', 0)).toBeNull();
    expect(at('cw', 501)).toBeNull();
    expect(at('ccw', 50)).toBeNull();
    expect(certificateAt({ points: [], direction: 'cw', torqueNm: 100 })).toBeNull();
  });
  it('refuses no torque', () => {
    expect(() => at('cw', -1)).toThrow(RangeError);
    expect(() => at('cw', Number.NaN)).toThrow(RangeError);
    expect(() => at('left' as 'cw', 100)).toThrow(RangeError);
  });
});

describe('correctionNm', () => {
  const of = (direction: 'cw' | 'ccw', rawNm: number) => correctionNm({ points, direction, rawNm });
  it('takes off what the tester reads too much', () => {
    // 2 % too much at 200 true: it shows 204, and the correction brings 204 back to 200.
    expect(204 + of('ccw', 204)).toBeCloseTo(200, 10);
    expect(of('cw', 100)).toBeCloseTo(100 / 1.002 - 100, 12);
  });
  it('adds what it reads too little', () => {
    expect(of('cw', 500)).toBeGreaterThan(0);
  });
  it('does not jump at the ends of the certified range', () => {
    expect(of('cw', 500.0001)).toBeCloseTo(of('cw', 500), 5);
    expect(of('cw', 49.9999)).toBeCloseTo(of('cw', 50), 5);
  });
  it('is nothing without a certificate, and at zero', () => {
    expect(correctionNm({ points: [], direction: 'cw', rawNm: 100 })).toBe(0);
    expect(of('cw', 0)).toBe(0);
  });
});
