import { notNegative, positive } from './assert';

export interface DeliveredPoint {
  settingNm: number;
  meanNm: number;
  expandedNm: number;
}

/**
 * What a tool delivers at a setting, N·m: linear between the tested points, null beyond them. The
 * uncertainty is interpolated too. The points may come in any order.
 * @throws {RangeError} for negative torques, no points, or two points at one setting.
 */
export function delivered(
  points: readonly DeliveredPoint[],
  settingNm: number,
): { valueNm: number; expandedNm: number } | null {
  notNegative(settingNm, 'The setting');
  if (points.length === 0) throw new RangeError('Nothing was tested: there are no points.');
  const ordered = [...points].sort((one, other) => one.settingNm - other.settingNm);
  ordered.forEach((point, index) => {
    positive(point.settingNm, 'A tested setting');
    notNegative(point.meanNm, 'A delivered torque');
    notNegative(point.expandedNm, 'An expanded uncertainty');
    if (ordered[index + 1]?.settingNm === point.settingNm) {
      throw new RangeError(`Two tested points stand at ${point.settingNm} N·m.`);
    }
  });

  const same = ordered.find((point) => Math.abs(point.settingNm - settingNm) <= 1e-9 * settingNm);
  if (same) return { valueNm: same.meanNm, expandedNm: same.expandedNm };
  const above = ordered.findIndex((point) => point.settingNm > settingNm);
  const upper = ordered[above];
  const lower = ordered[above - 1];
  if (!upper || !lower) return null;
  const share = (settingNm - lower.settingNm) / (upper.settingNm - lower.settingNm);
  return {
    valueNm: lower.meanNm + share * (upper.meanNm - lower.meanNm),
    expandedNm: lower.expandedNm + share * (upper.expandedNm - lower.expandedNm),
  };
}
