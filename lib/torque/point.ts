import { SERIES_NOT_RUN, referencePart, toolPart } from './budget';
import { conformanceProbability, testUncertaintyRatio } from './conformance';
import { summarise, type Summary } from './deviation';
import type { Budget, PointEvaluation } from './evaluation';
import type { CheckFacts, PullFact } from './facts';
import type { PlanPoint } from './plan';
import { meanAtTarget, noReleaseOf, readingsOf, voidedOf } from './readings';
import type { PointContext } from './readings';
import { certificateAt, type CertifiedAt } from './tester';
import { standardTolerance, toleranceAt, type Tolerance } from './tool';
import { combine, type Component } from './uncertainty';
import { convertTorque } from './units';
import { judgePoint } from './verdict';
import { reasonWords } from './words';

const expandedOf = (components: readonly Component[]): number => combine(components).expanded;

function uncertaintyOf(context: PointContext, certified: CertifiedAt, summary: Summary | null) {
  const { facts, targetNm } = context;
  const { tester, tool, temperatureC, plan } = facts;
  const reference = referencePart({
    tester,
    certified,
    setting: plan.setting,
    targetNm,
    temperatureC,
  });
  const uncorrectedErrorPercent = tester.correctionApplied ? 0 : Math.abs(certified.errorPercent);
  const referenceExpanded = expandedOf(reference.components) + uncorrectedErrorPercent;
  if (!summary) return { referenceExpanded, budget: null, notAssessed: reference.notAssessed };
  const { n, standardDeviation } = summary;
  const own = toolPart({ tool, targetNm, n, standardDeviation });
  const components = [...reference.components, ...own.components];
  const budget: Budget = { components, combined: combine(components), uncorrectedErrorPercent };
  return {
    referenceExpanded,
    budget,
    notAssessed: [...reference.notAssessed, ...own.notAssessed, ...SERIES_NOT_RUN],
  };
}

/** Probability that the mean conforms; an uncorrected error widens it as it widens `expanded`. */
function conformanceOf(summary: Summary, budget: Budget, limits: Tolerance): number {
  const { combined, uncorrectedErrorPercent } = budget;
  const standard = combined.standard + uncorrectedErrorPercent / combined.coverageFactor;
  return conformanceProbability({
    value: summary.mean,
    standard,
    lower: limits.lower,
    upper: limits.upper,
  });
}

function judgementOf(
  context: PointContext,
  input: {
    pulls: readonly PullFact[];
    deviations: number[];
    requiredReadings: number;
    referenceExpanded: number | null;
    exerciseMissing: boolean;
  },
) {
  const { facts, limits, targetNm } = context;
  const { pulls, deviations, requiredReadings, referenceExpanded } = input;
  const { noRelease, noReleaseNm, deviation } = noReleaseOf(context, pulls);
  if (!limits) {
    return {
      noRelease,
      noReleaseNm,
      verdict: 'not-judged' as const,
      simpleVerdict: 'not-judged' as const,
      reasons: ['below-claimed-range'],
    };
  }
  const certified = referenceExpanded !== null && targetNm >= facts.tester.minNm * (1 - 1e-9);
  const own = certified ? [] : ['outside-certified-range'];
  const judged = judgePoint({
    deviations,
    limits,
    referenceExpanded: referenceExpanded ?? 0,
    guard: facts.plan.guard,
    requiredReadings,
    barred: [...new Set([...facts.barred, ...own])],
    noRelease: deviation,
    unmet: [
      ...(input.exerciseMissing && deviations.length > 0 ? ['exercise-missing'] : []),
      ...(noRelease && deviation === null ? ['no-release-unproven'] : []),
    ],
  });
  return { noRelease, noReleaseNm, ...judged };
}

/**
 * One set point of a check from the pulls made at it. Deviations in per cent of the plan's basis.
 * @throws {RangeError} for a reading that is not above zero (reference basis) or not finite.
 */
export function evaluatePoint(options: {
  facts: CheckFacts;
  point: PlanPoint;
  /** The pulls of this point's reading steps, in sequence. */
  pulls: readonly PullFact[];
  requiredReadings: number;
  /** Is an exercise pull of this direction missing? */
  exerciseMissing: boolean;
}): PointEvaluation {
  const { facts, point, pulls, requiredReadings, exerciseMissing } = options;
  const { plan, tool, tester } = facts;
  const targetNm = convertTorque(point.target, plan.unit, 'N.m');
  const range = {
    min: convertTorque(tool.range.min, tool.unit, 'N.m'),
    max: convertTorque(tool.range.max, tool.unit, 'N.m'),
  };
  const limits = toleranceAt({
    claim: tool.claim,
    toolClass: tool.toolClass,
    range,
    direction: point.direction,
    targetNm,
    basis: plan.basis,
  });
  const context: PointContext = { facts, point, targetNm, limits };
  const readings = readingsOf(context, pulls);
  const deviations = readings.map((reading) => reading.deviation);
  const summary = deviations.length > 0 ? summarise(deviations) : null;

  const certified = certificateAt({
    points: tester.points,
    direction: point.direction,
    torqueNm: targetNm,
  });
  const uncertainty = certified ? uncertaintyOf(context, certified, summary) : null;
  const referenceExpanded = uncertainty?.referenceExpanded ?? null;
  const budget = uncertainty?.budget ?? null;
  const valueNm = meanAtTarget(context, readings);
  const { reasons, ...judged } = judgementOf(context, {
    pulls,
    deviations,
    requiredReadings,
    referenceExpanded,
    exerciseMissing,
  });

  return {
    direction: point.direction,
    target: point.target,
    targetNm,
    requiredReadings,
    readings,
    voided: voidedOf(context, pulls),
    summary,
    meanDelivered:
      budget && valueNm !== null
        ? {
            valueNm,
            expandedNm:
              (valueNm * (budget.combined.expanded + budget.uncorrectedErrorPercent)) / 100,
          }
        : null,
    limits,
    standardLimits: standardTolerance(tool.toolClass, range.max),
    referenceExpanded,
    guardPercent: referenceExpanded === null ? null : plan.guard * referenceExpanded,
    budget,
    notAssessed: uncertainty?.notAssessed ?? [],
    conformance: summary && budget && limits ? conformanceOf(summary, budget, limits) : null,
    testUncertaintyRatio:
      limits && referenceExpanded !== null && referenceExpanded > 0
        ? testUncertaintyRatio(limits, referenceExpanded)
        : null,
    ...judged,
    reasons: reasons.map((code) => ({ code, words: reasonWords(code) })),
    excluded: limits === null,
  };
}
