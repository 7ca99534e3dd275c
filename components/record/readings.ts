import type { RecordedPoint, RecordedPull, SignedRecord } from '@/lib/record/record';
import { VOID_FAULT_LABELS } from '@/lib/torque/faults';
import { convertTorque, decimalsOf, formatNumber, unitText } from '@/lib/torque/units';
import { deviationWords, directionWords } from '@/lib/torque/words';
import { signedPercent } from '@/components/corridor/words';

/** One pull of a set point, in words. */
export interface ReadingRow {
  id: string;
  /** 1 is the point's first pull that counts; null for a pull that does not. */
  number: number | null;
  /** What the tool said, and what the tester measured, in the tool's unit. */
  tool: string;
  tester: string;
  /** '+1.21 %'; '' without one. */
  deviation: string;
  words: string;
  voided: boolean;
}

/** The tool's division, when it is in the unit of the plan. */
export const divisionOf = ({ tool, plan }: SignedRecord): number | null =>
  tool.unit === plan.unit ? tool.division : null;

/** '120 N·m', with the direction where it does not go without saying. */
export function pointName(
  record: SignedRecord,
  point: Pick<RecordedPoint, 'target' | 'direction'>,
): string {
  const target = formatNumber(point.target, { division: divisionOf(record) });
  const turns = record.plan.points.some(({ direction }) => direction === 'ccw');
  const way = turns ? ` ${directionWords(point.direction)}` : '';
  return `${target} ${unitText(record.plan.unit)}${way}`;
}

/** What the tester measured, in the tool's unit, to one place more than the tester's step there. */
export function testerValue(record: SignedRecord, referenceNm: number | null): string {
  if (referenceNm === null) return 'not read';
  const { unit } = record.plan;
  const step = convertTorque(record.tester.resolutionNm, 'N.m', unit);
  const division = 10 ** -decimalsOf(Number(step.toPrecision(1)));
  return formatNumber(convertTorque(referenceNm, 'N.m', unit), { division });
}

/** Why a pull was voided, with the note that was made of it. */
export function voidWords(pull: Pick<RecordedPull, 'fault' | 'note'>): string {
  const why = pull.fault === null ? 'no fault stated' : VOID_FAULT_LABELS[pull.fault];
  return `Voided: ${why}${pull.note ? ` (${pull.note})` : ''}`;
}

function rowWords(record: SignedRecord, pull: RecordedPull, deviation: number | undefined): string {
  if (pull.state === 'voided') return voidWords(pull);
  if (pull.outcome === 'no-release') return 'did not let go by this torque';
  return deviation === undefined ? '' : deviationWords(deviation, record.plan.basis);
}

/** Every reading pull of a set point in the order it was made, the voided ones too. */
export function readingRows(record: SignedRecord, point: RecordedPoint): ReadingRow[] {
  const division = divisionOf(record);
  const deviations = new Map(
    [...point.readings, ...point.voided].map((one) => [one.pullId, one.deviation ?? undefined]),
  );
  const own = record.pulls
    .filter(
      (pull) =>
        pull.kind === 'reading' &&
        pull.direction === point.direction &&
        pull.target === point.target &&
        pull.state !== 'offered',
    )
    .sort((one, other) => one.sequence - other.sequence);
  let counted = 0;
  return own.map((pull) => {
    const deviation = pull.outcome === 'reading' ? deviations.get(pull.id) : undefined;
    const voided = pull.state === 'voided';
    if (!voided) counted += 1;
    return {
      id: pull.id,
      number: voided ? null : counted,
      tool: formatNumber(pull.toolValue, { division }),
      tester: testerValue(record, pull.referenceNm),
      deviation: deviation === undefined ? '' : signedPercent(deviation, 2),
      words: rowWords(record, pull, deviation),
      voided,
    };
  });
}
