import type { PointEvaluation } from './evaluation';
import type { CheckPlan } from './plan';
import { formatNumber, unitText } from './units';
import type { Verdict } from './verdict';
import { directionWords, listWords, verdictWords } from './words';

type StatedPoint = Pick<
  PointEvaluation,
  'direction' | 'target' | 'verdict' | 'excluded' | 'reasons'
>;

/** '45 and 110 N·m'; with directions where clockwise does not go without saying. */
function pointsWords(points: readonly StatedPoint[], plan: CheckPlan, division: number | null) {
  const clockwiseAlone = plan.points.every((point) => point.direction === 'cw');
  const groups = [...new Set(points.map((point) => point.direction))].map((direction) => {
    const targets = points
      .filter((point) => point.direction === direction)
      .map((point) => formatNumber(point.target, { division }));
    const words = `${listWords(targets)} ${unitText(plan.unit)}`;
    return clockwiseAlone ? words : `${words} ${directionWords(direction)}`;
  });
  return listWords(groups);
}

const SCHEME_WORDS: Partial<Record<CheckPlan['scheme'], string>> = {
  short: ' (short check)',
  working: ' (working points)',
};

function sequenceWords(plan: CheckPlan): string {
  return plan.isStandardSequence ? '' : (SCHEME_WORDS[plan.scheme] ?? ' (changed sequence)');
}

/**
 * The verdict of a check in words: `Within at 45 and 110 N·m (short check)`. Anything but the
 * standard's whole sequence never says 'within' alone, and says which sequence it was.
 */
export function statementOf(options: {
  plan: CheckPlan;
  points: readonly StatedPoint[];
  verdict: Verdict;
  /** The tool's division in the plan's unit, for its decimals. */
  division: number | null;
}): string {
  const { plan, points, verdict, division } = options;
  const counted = points.filter((point) => !point.excluded);
  const excluded = points.filter((point) => point.excluded);
  const suffix = sequenceWords(plan);
  if (counted.length === 0) return 'Not judged: no point lies in the claimed range';

  const deciding = counted.filter((point) => point.verdict === verdict);
  if (verdict === 'not-judged') {
    const why = [...new Set(deciding.flatMap((point) => point.reasons.map(({ words }) => words)))];
    return `${verdictWords(verdict)}: ${listWords(why)}${suffix}`;
  }
  if (verdict === 'within' && plan.isStandardSequence && excluded.length === 0) {
    return 'Within tolerance';
  }
  const where = `${verdictWords(verdict)} at ${pointsWords(deciding, plan, division)}${suffix}`;
  if (verdict !== 'within' || excluded.length === 0) return where;
  return `${where}; ${pointsWords(excluded, plan, division)} below the claimed range, not counted`;
}
