import { Disclosure } from '@/components/ui/disclosure';
import { VerdictMark } from '@/components/verdict/verdict-mark';
import type { RecordedPoint, SignedRecord } from '@/lib/record/record';
import { statementOf } from '@/lib/torque/statement';
import { basisWords, limitSourceWords, verdictWords } from '@/lib/torque/words';
import { Facts } from './facts';
import { limitsWords } from './meaning';
import { divisionOf, pointName } from './readings';

const percent = (value: number): string => `${value.toFixed(2)} %`;

/** The answer without guard band, in the words that a verdict of this plan has. */
const simpleStatement = (record: SignedRecord): string =>
  statementOf({
    plan: record.plan,
    points: record.evaluation.points.map((point) => ({ ...point, verdict: point.simpleVerdict })),
    verdict: record.evaluation.simpleVerdict,
    division: divisionOf(record),
  });

const guardWords = (guard: number): string =>
  guard === 0
    ? 'none: simple acceptance'
    : `${guard} × the reference’s expanded uncertainty${guard === 1 ? ' (ILAC-G8, w = U)' : ''}`;

/** Tolerance, guard band and every answer that can be drawn from the same readings. */
export function JudgedPart({ record }: { record: SignedRecord }) {
  const { plan, evaluation } = record;
  return (
    <Disclosure summary="How it was judged">
      <p>
        Every reading counts, not the mean. A tool is outside when a reading is beyond a limit by
        more than the guard band, and within when every reading is inside by more than it.
      </p>
      <Facts
        facts={[
          ['Deviation', basisWords(plan.basis)],
          ['Guard band', guardWords(plan.guard)],
          ['With the guard band', evaluation.statement],
          [
            'Without guard band',
            <VerdictMark
              key="simple"
              verdict={evaluation.simpleVerdict}
              words={simpleStatement(record)}
              size="small"
            />,
          ],
        ]}
      />
      {evaluation.points.map((point) => (
        <section key={`${point.direction}${point.target}`}>
          <h3 className="font-code text-xl font-semibold">{pointName(record, point)}</h3>
          <PointJudged point={point} />
        </section>
      ))}
    </Disclosure>
  );
}

function PointJudged({ point }: { point: RecordedPoint }) {
  const { limits, standardLimits, summary } = point;
  return (
    <Facts
      facts={[
        [
          'Tolerance',
          limits
            ? `${limitsWords(limits)}, ${limitSourceWords(limits.source)}`
            : 'none: below the claimed range',
        ],
        ['The standard’s limits', limitsWords(standardLimits)],
        ['Guard band', point.guardPercent === null ? 'not known' : percent(point.guardPercent)],
        [
          'Reference’s expanded uncertainty',
          point.referenceExpanded === null
            ? 'not certified here'
            : percent(point.referenceExpanded),
        ],
        [
          'Test uncertainty ratio',
          point.testUncertaintyRatio === null
            ? null
            : `${point.testUncertaintyRatio.toFixed(1)} to 1`,
        ],
        ['Spread of the readings', summary && summary.n > 1 ? percent(summary.spread) : null],
        [
          'Probability that the mean conforms',
          point.conformance === null ? null : `${(100 * point.conformance).toFixed(1)} %`,
        ],
        ['Verdict here', point.excluded ? 'not counted' : verdictWords(point.verdict)],
        ['Without guard band', point.excluded ? null : verdictWords(point.simpleVerdict)],
        ['Why', point.reasons.map(({ words }) => words).join('; ')],
      ]}
    />
  );
}
