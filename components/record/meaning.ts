import { signedPercent } from '@/components/corridor/words';
import { deliveredWords } from '@/lib/format/measured';
import type { RecordedPoint, SignedRecord } from '@/lib/record/record';
import type { Limits } from '@/lib/torque/claim';
import { formatNumber } from '@/lib/torque/units';
import { directionWords } from '@/lib/torque/words';
import { divisionOf, pointName, testerValue } from './readings';

/** '±4 %', or '−3.85 % to +4.17 %' where the two sides differ. */
export function limitsWords({ lower, upper }: Limits): string {
  return Math.abs(lower + upper) < 1e-9
    ? `±${Number(upper.toFixed(2))} %`
    : `${signedPercent(lower)} to ${signedPercent(upper)}`;
}

/** 'Set to 120 N·m, it delivers 118.5 ± 0.7 N·m' */
export function deliversWords(record: SignedRecord, point: RecordedPoint): string | null {
  if (!point.meanDelivered) return null;
  const { plan } = record;
  const targetLabel = formatNumber(point.target, { division: divisionOf(record) });
  const words = deliveredWords(
    { targetLabel, setting: plan.setting, unit: plan.unit },
    point.meanDelivered,
  );
  return point.direction === 'ccw' ? `${words}, ${directionWords('ccw')}` : words;
}

/** The set point that says most: of those that decide it the furthest off, else the middle one. */
function tellingPoint({ evaluation }: SignedRecord): RecordedPoint | null {
  const known = evaluation.points.filter((point) => point.meanDelivered !== null);
  const counted = known.filter((point) => !point.excluded);
  const off = (point: RecordedPoint) => Math.abs(point.summary?.mean ?? 0);
  const isClear = evaluation.verdict === 'within' || evaluation.verdict === 'not-judged';
  const deciding = counted
    .filter((point) => !isClear && point.verdict === evaluation.verdict)
    .sort((one, other) => off(other) - off(one));
  const clockwise = counted.filter((point) => point.direction === 'cw');
  const usual = clockwise.length > 0 ? clockwise : counted.length > 0 ? counted : known;
  return deciding[0] ?? usual[Math.floor(usual.length / 2)] ?? null;
}

function allowedWords(points: readonly RecordedPoint[]): string {
  const limits = [...new Set(points.flatMap((p) => (p.limits ? [limitsWords(p.limits)] : [])))];
  const claims = points.every((point) => point.limits?.source === 'claim');
  const standards = points.every((point) => point.limits?.source === 'standard');
  const only = limits.length === 1 ? `the ${limits[0]}` : 'the limits';
  if (claims) return `${only} that its maker claims`;
  return standards ? `${only} that the standard allows` : only;
}

function outsideWords(record: SignedRecord, counted: readonly RecordedPoint[]): string[] {
  const readings = counted.flatMap((point) => point.readings);
  const beyond = readings.filter((reading) => reading.beyond);
  const stuck = counted.filter(
    (point) => point.noReleaseNm !== null && point.verdict === 'outside',
  );
  const isLow = (deviation: number) =>
    record.plan.basis === 'reference' ? deviation > 0 : deviation < 0;
  const low = beyond.some(({ deviation }) => isLow(deviation));
  const high = beyond.some(({ deviation }) => !isLow(deviation)) || stuck.length > 0;
  const way = low && high ? 'looser or tighter' : low ? 'looser' : 'tighter';
  return [
    ...(beyond.length > 0
      ? [
          `${beyond.length} of ${readings.length} readings ${beyond.length === 1 ? 'is' : 'are'} beyond ${allowedWords(counted)}.`,
        ]
      : []),
    ...stuck.map(
      (point) =>
        `At ${pointName(record, point)} it had not let go by ${testerValue(record, point.noReleaseNm)}.`,
    ),
    ...(low || high ? [`Bolts may end up ${way} than you think.`] : []),
    'Have it adjusted or recalibrated before you rely on it.',
  ];
}

/** What the result means to the owner of the tool: a few plain sentences. */
export function meaningOf(record: SignedRecord): { delivers: string | null; rest: string } {
  const point = tellingPoint(record);
  const delivers = point && deliversWords(record, point);
  const counted = record.evaluation.points.filter(({ excluded }) => !excluded);
  const count = counted.reduce((sum, { readings }) => sum + readings.length, 0);
  const rest = {
    within: () => [
      `All ${count} readings are inside ${allowedWords(counted)}, by more than the measurement uncertainty.`,
    ],
    outside: () => outsideWords(record, counted),
    'too-close': () => [
      'At least one reading lies nearer to a limit than our measurement can tell apart. It may be inside, and it may not.',
    ],
    'not-judged': () => [
      'The readings are shown as they were taken, and no verdict is drawn from them.',
    ],
  }[record.evaluation.verdict]();
  return { delivers, rest: rest.join(' ') };
}
