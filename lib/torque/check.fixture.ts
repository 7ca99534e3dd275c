import type { CheckFacts, PullFact } from './facts';
import { buildPlan, type PlanInput } from './plan';
import { relativeDeviation } from './deviation';
import type { CertificatePoint } from './tester';
import { convertTorque } from './units';

/** Facts for tests: an invented click wrench, 60 to 340 N·m, on an invented tester. */
export const clickWrench: PlanInput = {
  toolClass: 'II-A',
  range: { min: 60, max: 340 },
  unit: 'N.m',
  division: 1,
  directions: ['cw'],
  scheme: 'short',
};

const certified = (torqueNm: number): CertificatePoint => ({
  direction: 'cw',
  torqueNm,
  errorPercent: 0.2,
  expandedPercent: 0.5,
  k: 2,
});

/** A check before its first pull. */
export function factsOf(
  input: Partial<PlanInput> = {},
  change: Partial<Omit<CheckFacts, 'plan'>> = {},
): CheckFacts {
  const planInput = { ...clickWrench, ...input };
  return {
    plan: buildPlan(planInput),
    tool: {
      toolClass: planInput.toolClass,
      range: planInput.range,
      unit: planInput.unit,
      division: planInput.division ?? null,
      claim: null,
    },
    tester: {
      minNm: 20,
      maxNm: 500,
      resolutionNm: 0.1,
      points: [certified(50), certified(500)],
      correctionApplied: false,
      yearlyDriftPercent: 0.2,
      yearsSinceCertification: 0.5,
      temperatureCoefficientPercentPerK: null,
      certificateTemperatureC: 21,
    },
    temperatureC: 22,
    pulls: [],
    barred: [],
    ...change,
  };
}

/** An accepted pull of a step; reads the target unless told otherwise. */
export function pullOf(
  facts: CheckFacts,
  stepIndex: number,
  change: Partial<PullFact> = {},
): PullFact {
  const target = facts.plan.steps[stepIndex]?.target ?? 0;
  return {
    id: `pull-${stepIndex}`,
    sequence: stepIndex + 1,
    stepIndex,
    toolValue: target,
    rawNm: convertTorque(target, facts.plan.unit, 'N.m'),
    correctionNm: 0,
    outcome: 'reading',
    state: 'accepted',
    fault: null,
    note: null,
    ...change,
  };
}

/** The same check with the first `count` steps pulled; `rawNm` says what the tester showed. */
export function pulled(
  facts: CheckFacts,
  count: number = facts.plan.steps.length,
  rawNm: (targetNm: number, stepIndex: number) => number = (targetNm) => targetNm,
): CheckFacts {
  const pulls = facts.plan.steps.slice(0, count).map((step, index) => {
    const targetNm = convertTorque(step.target, facts.plan.unit, 'N.m');
    return pullOf(facts, index, { rawNm: rawNm(targetNm, index) });
  });
  return { ...facts, pulls };
}

/** The reference that gives a deviation, for the reference basis: x_r = x_a/(1 + d/100). */
export function referenceFor(targetNm: number, deviation: number): number {
  const referenceNm = targetNm / (1 + deviation / 100);
  if (Math.abs(relativeDeviation(targetNm, referenceNm) - deviation) > 1e-9) {
    throw new Error('The fixture does not give the deviation it was asked for.');
  }
  return referenceNm;
}
