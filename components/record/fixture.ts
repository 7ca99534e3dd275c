import { canonical } from '@/lib/record/canonical';
import { parseRecord, RECORD_FORMAT, RECORD_VERSION, type SignedRecord } from '@/lib/record/record';
import { evaluateCheck, type CheckFacts, type PullFact } from '@/lib/torque/check';
import { buildPlan, type PlanInput } from '@/lib/torque/plan';
import { convertTorque } from '@/lib/torque/units';

interface FixtureInput {
  plan?: Partial<PlanInput>;
  facts?: Partial<Omit<CheckFacts, 'plan' | 'pulls'>>;
  /** What the tester showed, N·m, for the target in N·m. */
  rawNm?: (targetNm: number, stepIndex: number) => number;
  /** Further pulls, such as voided ones. */
  extraPulls?: Partial<PullFact>[];
  change?: Partial<SignedRecord>;
}

/** An invented click wrench, 60 to 340 N·m, as its canonical text gives it back; for tests. */
export function recordFixture(input: FixtureInput = {}): SignedRecord {
  const plan = buildPlan({
    toolClass: 'II-A',
    range: { min: 60, max: 340 },
    unit: 'N.m',
    division: 2,
    directions: ['cw'],
    scheme: 'iso-2003',
    ...input.plan,
  });
  const pull = (stepIndex: number, change: Partial<PullFact> = {}): PullFact => {
    const target = plan.steps[stepIndex]!.target;
    const targetNm = convertTorque(target, plan.unit, 'N.m');
    return {
      id: `pull-${stepIndex}`,
      sequence: stepIndex + 1,
      stepIndex,
      toolValue: target,
      rawNm: (input.rawNm ?? ((nm: number) => nm))(targetNm, stepIndex),
      correctionNm: 0,
      outcome: 'reading',
      state: 'accepted',
      fault: null,
      note: null,
      ...change,
    };
  };
  const facts: CheckFacts = {
    plan,
    tool: {
      toolClass: plan.toolClass,
      range: input.plan?.range ?? { min: 60, max: 340 },
      unit: plan.unit,
      division: 2,
      claim: { of: 'reading', cwPercent: 4, ccwPercent: null },
    },
    tester: {
      minNm: 10,
      maxNm: 500,
      resolutionNm: 0.1,
      points: [10, 500].map((torqueNm) => ({
        direction: 'cw' as const,
        torqueNm,
        errorPercent: 0.1,
        expandedPercent: 0.3,
        k: 2,
      })),
      correctionApplied: false,
      yearlyDriftPercent: 0.2,
      yearsSinceCertification: 0.5,
      temperatureCoefficientPercentPerK: null,
      certificateTemperatureC: 20,
    },
    temperatureC: 22,
    barred: [],
    ...input.facts,
    pulls: [
      ...plan.steps.map((_, index) => pull(index)),
      ...(input.extraPulls ?? []).map((extra, index) =>
        pull(extra.stepIndex ?? 0, { id: `extra-${index}`, sequence: 900 + index, ...extra }),
      ),
    ],
  };
  const evaluation = evaluateCheck(facts);
  const record = {
    format: RECORD_FORMAT,
    version: RECORD_VERSION,
    number: 'QM-2026-0147',
    post: { id: 'post-1', name: 'Quillmoor post', shortName: 'QM' },
    meet: {
      id: 'meet-1',
      name: 'Quillmoor Autumn Meet',
      place: 'Quillmoor',
      startsOn: '2026-10-09',
      timeZone: 'Europe/London',
    },
    checkId: 'check-1',
    tagCode: 'A31',
    toolId: 'tool-1',
    startedAt: '2026-10-09T13:40:00.000Z',
    signedAt: '2026-10-09T13:51:00.000Z',
    signedBy: { staffId: 'staff-1' },
    tool: {
      ...facts.tool,
      toolId: 'tool-1',
      nominal: null,
      measuresCcw: false,
      drive: '½ in',
      maker: null,
      serial: null,
    },
    asFound: {
      settingFound: 60,
      damage: '',
      battery: 'not-fitted',
      zeroShown: null,
      scale: 'N·m',
      head: '',
      testerMode: 'first-peak',
      temperatureC: facts.temperatureC,
    },
    plan,
    planVersion: 3,
    tester: {
      ...facts.tester,
      id: 'tester-1',
      name: 'T-02',
      maker: 'Harrowgate',
      model: 'HX 500',
      serial: 'HX-0002',
    },
    certificate: {
      id: 'certificate-1',
      number: 'C-2026-0117',
      laboratory: 'Quern Laboratory',
      accreditation: 'Q-0042',
      issuedOn: '2026-03-14',
      dueOn: '2027-03-14',
      traceability: 'To the SI',
      correctionApplied: false,
    },
    proof: {
      id: 'proof-1',
      method: 'dead-weight',
      loadNm: 100,
      readingNm: 100.1,
      limitPercent: 0.5,
      at: '2026-10-09T07:10:00.000Z',
      result: 'passed',
    },
    barred: facts.barred,
    temperatureC: facts.temperatureC,
    pulls: facts.pulls.map((one) => ({
      ...one,
      kind: plan.steps[one.stepIndex]!.kind,
      direction: plan.steps[one.stepIndex]!.direction,
      target: plan.steps[one.stepIndex]!.target,
      referenceNm: one.rawNm,
      source: 'keyed',
      at: '2026-10-09T13:45:00.000Z',
    })),
    notes: [{ at: '2026-10-09T13:46:00.000Z', text: 'Owner <watched>' }],
    evaluation,
    notFollowed: evaluation.notFollowed,
    stoppedEarly: facts.stoppedEarly ?? false,
    stopReason: facts.stopReason ?? null,
    codeVersion: '0.1.0',
    ...input.change,
  };
  return parseRecord(canonical(record));
}
