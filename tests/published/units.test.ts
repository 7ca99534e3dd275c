import { unit as mathUnit } from 'mathjs';
import { describe, expect, it } from 'vitest';
import { convertTorque, TORQUE_UNITS, type TorqueUnit } from '@/lib/torque/units';

describe('NIST SP 811 (2008), Appendix B.8: torque to N·m, seven figures', () => {
  it.each<[TorqueUnit, number]>([
    ['lbf.ft', 1.355818],
    ['lbf.in', 0.1129848],
    ['ozf.in', 7.061552e-3],
    ['kgf.m', 9.80665],
  ])('%s', (unit, published) => {
    const computed = convertTorque(1, unit, 'N.m');
    expect(Number(computed.toPrecision(7))).toBe(published);
  });
});

describe('mathjs units, which hold the same definitions', () => {
  const names: Record<TorqueUnit, string> = {
    'N.m': 'N m',
    'lbf.ft': 'lbf ft',
    'lbf.in': 'lbf in',
    // mathjs has no ounce-force: a sixteenth of a pound-force.
    'ozf.in': 'lbf in',
    'kgf.m': 'kgf m',
    'kgf.cm': 'kgf cm',
  };
  it.each(TORQUE_UNITS)('%s', (unit) => {
    const oracle = mathUnit(unit === 'ozf.in' ? 1 / 16 : 1, names[unit]).toNumber('N m');
    expect(Math.abs(convertTorque(1, unit, 'N.m') / oracle - 1)).toBeLessThan(1e-12);
  });
});
