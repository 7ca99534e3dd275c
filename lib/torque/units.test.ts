import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import {
  convertTorque,
  decimalsOf,
  formatNumber,
  formatTorque,
  formatTorqueDifference,
  TORQUE_UNITS,
  type TorqueUnit,
} from './units';

const unknown = 'Nm' as TorqueUnit;

describe('convertTorque', () => {
  it('is exact by definition', () => {
    expect(convertTorque(1, 'lbf.ft', 'N.m')).toBe(1.3558179483314004);
    expect(convertTorque(1, 'lbf.ft', 'lbf.in')).toBeCloseTo(12, 13);
    expect(convertTorque(1, 'lbf.in', 'ozf.in')).toBeCloseTo(16, 13);
    expect(convertTorque(1, 'kgf.m', 'kgf.cm')).toBeCloseTo(100, 12);
    expect(convertTorque(1, 'kgf.m', 'N.m')).toBe(9.80665);
  });
  it('leaves a value in its own unit untouched', () => {
    expect(convertTorque(0.1, 'kgf.cm', 'kgf.cm')).toBe(0.1);
  });
  it('comes back', () => {
    const unit = fc.constantFrom(...TORQUE_UNITS);
    fc.assert(
      fc.property(fc.double({ min: 0, max: 1e6, noNaN: true }), unit, unit, (value, from, to) => {
        const back = convertTorque(convertTorque(value, from, to), to, from);
        expect(Math.abs(back - value)).toBeLessThanOrEqual(1e-15 * value + 1e-300);
      }),
    );
  });
  it('refuses what is no torque, in words', () => {
    expect(() => convertTorque(Number.NaN, 'N.m', 'lbf.ft')).toThrow(RangeError);
    expect(() => convertTorque(Infinity, 'N.m', 'lbf.ft')).toThrow(RangeError);
    expect(() => convertTorque(-1, 'N.m', 'lbf.ft')).toThrow(/must not be negative/);
    expect(() => convertTorque('5' as unknown as number, 'N.m', 'lbf.ft')).toThrow(TypeError);
    expect(() => convertTorque(1, unknown, 'N.m')).toThrow(/'Nm' is not known/);
    expect(() => convertTorque(1, 'N.m', unknown)).toThrow(RangeError);
  });
});

describe('formatTorque', () => {
  it.each<[number, TorqueUnit, number | undefined, string]>([
    [204, 'N.m', 1, '204 N·m'],
    [38.26, 'lbf.ft', 0.1, '38.3 lbf·ft'],
    [38.3, 'lbf.in', 0.05, '38.30 lbf·in'],
    [120, 'kgf.cm', 2.5, '120.0 kgf·cm'],
    [45, 'ozf.in', undefined, '45 ozf·in'],
    [118.54, 'N.m', undefined, '118.5 N·m'],
    [0.12345, 'N.m', undefined, '0.123 N·m'],
    [1234.5, 'kgf.m', undefined, '1235 kgf·m'],
    [0, 'N.m', undefined, '0 N·m'],
    [100, 'N.m', undefined, '100 N·m'],
  ])('%d %s by %s', (value, unit, division, text) => {
    expect(formatTorque(value, unit, { division })).toBe(text);
  });
  it('rounds halves as they are written', () => {
    expect(formatTorque(1.005, 'N.m', { division: 0.01 })).toBe('1.01 N·m');
    expect(formatNumber(2.5, { division: 1 })).toBe('3');
  });
  it('refuses what convertTorque refuses', () => {
    expect(() => formatTorque(-1, 'N.m')).toThrow(RangeError);
    expect(() => formatTorque(1, unknown)).toThrow(RangeError);
    expect(() => formatTorque(1, 'N.m', { division: 0 })).toThrow(RangeError);
  });
  it('has a form with a sign for differences', () => {
    expect(formatTorqueDifference(-0.12, 'N.m')).toBe('−0.12 N·m');
    expect(formatTorqueDifference(-0.0001, 'N.m', { division: 0.1 })).toBe('0.0 N·m');
  });
});

describe('decimalsOf', () => {
  it.each([
    [5, 0],
    [1, 0],
    [2.5, 1],
    [0.25, 2],
    [0.1, 1],
    [0.05, 2],
  ])('%d needs %d', (division, decimals) => expect(decimalsOf(division)).toBe(decimals));
});
