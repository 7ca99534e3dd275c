import { finite, notNegative, oneOf, positive } from './assert';

/** The torque units of tools and testers. */
export const TORQUE_UNITS = ['N.m', 'lbf.ft', 'lbf.in', 'ozf.in', 'kgf.m', 'kgf.cm'] as const;
export type TorqueUnit = (typeof TORQUE_UNITS)[number];

// Exact by definition: 1 lbf = 4.4482216152605 N, 1 ft = 0.3048 m, 1 kgf = 9.80665 N.
const LBF_N = 4.4482216152605;
const INCH_M = 0.0254;
const KGF_N = 9.80665;

/** Newton metres in one of each unit. */
const NEWTON_METRES: Record<TorqueUnit, number> = {
  'N.m': 1,
  'lbf.ft': LBF_N * 0.3048,
  'lbf.in': LBF_N * INCH_M,
  'ozf.in': (LBF_N / 16) * INCH_M,
  'kgf.m': KGF_N,
  'kgf.cm': KGF_N / 100,
};

const UNIT_TEXT: Record<TorqueUnit, string> = {
  'N.m': 'N·m',
  'lbf.ft': 'lbf·ft',
  'lbf.in': 'lbf·in',
  'ozf.in': 'ozf·in',
  'kgf.m': 'kgf·m',
  'kgf.cm': 'kgf·cm',
};

/** A unit as it is printed: `N·m`, `lbf·ft`. Throws a RangeError for an unknown unit. */
export function unitText(unit: TorqueUnit): string {
  return UNIT_TEXT[oneOf(unit, TORQUE_UNITS, 'The torque unit')];
}

/**
 * A torque in another unit, by the exact definitions of the pound, the foot and the kilopond.
 * @throws {RangeError} for NaN, infinite or negative torque and unknown units; {TypeError} for no number.
 * @example convertTorque(100, 'lbf.ft', 'N.m') // 135.58179483314
 */
export function convertTorque(value: number, from: TorqueUnit, to: TorqueUnit): number {
  notNegative(value, 'A torque');
  const factor = NEWTON_METRES[oneOf(from, TORQUE_UNITS, 'The torque unit')];
  const divisor = NEWTON_METRES[oneOf(to, TORQUE_UNITS, 'The torque unit')];
  return from === to ? value : (value * factor) / divisor;
}

/** Decimals that a scale division or display step needs: 5 → 0, 2.5 → 1, 0.05 → 2. At most 6. */
export function decimalsOf(division: number): number {
  positive(division, 'A division');
  for (let decimals = 0; decimals < 6; decimals += 1) {
    const scaled = division * 10 ** decimals;
    if (Math.abs(scaled - Math.round(scaled)) < 1e-6 * scaled) return decimals;
  }
  return 6;
}

/** Fixed decimals, halves away from zero as written in decimal (1.005 → 1.01). */
function fixed(value: number, decimals: number): string {
  const scaled = Number((Math.abs(value) * 10 ** decimals).toPrecision(15));
  const text = (Math.round(scaled) / 10 ** decimals).toFixed(decimals);
  return value < 0 && Number(text) !== 0 ? `−${text}` : text;
}

/** The number alone: to the division's decimals, else up to four figures without closing zeros. */
export function formatNumber(value: number, options: { division?: number | null } = {}): string {
  finite(value, 'A value');
  if (options.division != null) return fixed(value, decimalsOf(options.division));
  const size = Math.abs(value);
  const whole = size < 1 ? 0 : Math.floor(Math.log10(size));
  const text = fixed(value, Math.max(0, 3 - whole));
  return text.includes('.') ? text.replace(/\.?0+$/, '') : text;
}

/**
 * A torque as it is shown: `204 N·m`, `38.3 lbf·ft`. `value` is in `unit`; with a division, to that
 * division's decimals, else up to four figures.
 * @throws {RangeError} for NaN, infinite or negative torque and unknown units.
 */
export function formatTorque(
  value: number,
  unit: TorqueUnit,
  options: { division?: number | null } = {},
): string {
  return `${formatNumber(notNegative(value, 'A torque'), options)} ${unitText(unit)}`;
}

/** A signed difference of torques, such as a correction: `−0.12 N·m`. */
export function formatTorqueDifference(
  value: number,
  unit: TorqueUnit,
  options: { division?: number | null } = {},
): string {
  return `${formatNumber(value, options)} ${unitText(unit)}`;
}
