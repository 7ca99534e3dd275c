import { convertTorque, unitText, type TorqueUnit } from '@/lib/torque/units';

/**
 * Decimals for an expanded uncertainty: two figures when it begins with 1 or 2, else one, and the
 * value is rounded alike (GUM 7.2.6 asks for at most two).
 */
export function uncertaintyDecimals(expanded: number): number {
  if (!(expanded > 0)) return 1;
  const exponent = Math.floor(Math.log10(expanded));
  const leading = Math.floor(expanded / 10 ** exponent + 1e-9);
  return Math.min(6, Math.max(0, (leading <= 2 ? 1 : 0) - exponent));
}

/** '118.5 ± 0.7 N·m'. Both in N·m; shown in `unit`. */
export function measuredWords(valueNm: number, expandedNm: number, unit: TorqueUnit): string {
  const value = convertTorque(valueNm, 'N.m', unit);
  const expanded = convertTorque(expandedNm, 'N.m', unit);
  const decimals = uncertaintyDecimals(expanded);
  return `${value.toFixed(decimals)} ± ${expanded.toFixed(decimals)} ${unitText(unit)}`;
}

/** 'Set to 120 N·m, it delivers 118.5 ± 0.7 N·m.' An indicating tool shows instead of being set. */
export function deliveredWords(
  point: { targetLabel: string; setting: boolean; unit: TorqueUnit },
  delivered: { valueNm: number; expandedNm: number },
): string {
  const when = point.setting ? 'Set to' : 'When it shows';
  return `${when} ${point.targetLabel} ${unitText(point.unit)}, it delivers ${measuredWords(delivered.valueNm, delivered.expandedNm, point.unit)}`;
}
