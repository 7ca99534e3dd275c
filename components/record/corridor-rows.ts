import type { CorridorRow } from '@/components/corridor/types';
import type { SignedRecord } from '@/lib/record/record';
import { formatNumber, unitText } from '@/lib/torque/units';
import { deviationWords } from '@/lib/torque/words';
import { divisionOf } from './readings';

/** The record's set points as the corridor draws them. */
export function corridorRows(record: SignedRecord): CorridorRow[] {
  const { plan } = record;
  return record.evaluation.points.map((point) => ({
    label: formatNumber(point.target, { division: divisionOf(record) }),
    unitLabel: unitText(plan.unit),
    direction: point.direction,
    lower: point.limits?.lower ?? null,
    upper: point.limits?.upper ?? null,
    guardPercent: point.guardPercent,
    readings: point.readings.map(({ deviation, beyond }) => ({ deviation, beyond })),
    mean: point.summary?.mean ?? null,
    // An error of the certificate that is not corrected widens the uncertainty, linearly.
    meanExpanded: point.budget
      ? point.budget.combined.expanded + point.budget.uncorrectedErrorPercent
      : null,
    words: point.summary ? deviationWords(point.summary.mean, plan.basis) : '',
    excluded: point.excluded,
  }));
}
