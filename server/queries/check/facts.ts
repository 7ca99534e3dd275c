import { serviceDay } from '@/lib/time/service-day';
import { barredReasons } from '@/lib/torque/barred';
import type { CheckFacts, PullFact } from '@/lib/torque/check';
import type { CheckPlan } from '@/lib/torque/plan';
import type { CheckFile, PullFile } from './load';

const DAYS_A_YEAR = 365.25;
const MS_A_DAY = 86_400_000;

export const pullState = ({ accepted, voided }: PullFile): PullFact['state'] =>
  voided ? 'voided' : accepted ? 'accepted' : 'offered';

/** A reading, or a pull at whose end nothing had let go: as it was taken, else as it came. */
export const outcomeOf = ({ pull, accepted }: PullFile): PullFact['outcome'] =>
  accepted?.outcome ?? pull.outcome;

/** A stored pull as the computation takes it. */
export const pullFact = (plan: CheckPlan, one: PullFile): PullFact => ({
  id: one.pull.id,
  sequence: one.pull.sequence,
  stepIndex: one.pull.stepIndex,
  toolValue: one.accepted?.toolValue ?? plan.steps[one.pull.stepIndex]!.target,
  rawNm: one.pull.rawNm,
  correctionNm: one.pull.correctionNm,
  outcome: outcomeOf(one),
  state: pullState(one),
  fault: one.voided?.fault ?? null,
  note: one.voided?.note ?? null,
});

/** Stored rows as the computation takes them. */
export function factsOf(file: CheckFile): CheckFacts {
  const { check, tool, tester, certificate, proof, meet } = file;
  const today = serviceDay(check.startedAt, meet.timeZone, meet.dayStartHour);
  const days = certificate
    ? (check.startedAt.getTime() - Date.parse(certificate.issuedOn)) / MS_A_DAY
    : 0;
  return {
    plan: check.plan,
    tool: {
      toolClass: tool.toolClass,
      range: { min: tool.rangeMin, max: tool.rangeMax },
      unit: tool.unit,
      division: tool.division,
      claim: tool.claim,
    },
    tester: {
      minNm: tester.minNm,
      maxNm: tester.maxNm,
      resolutionNm: tester.resolutionNm,
      points: certificate?.points ?? [],
      correctionApplied: tester.correctionApplied,
      yearlyDriftPercent: tester.yearlyDriftPercent,
      yearsSinceCertification: Math.max(0, days / DAYS_A_YEAR),
      temperatureCoefficientPercentPerK: tester.temperatureCoefficientPercentPerK,
      certificateTemperatureC: certificate?.temperatureC ?? null,
    },
    temperatureC: check.asFound.temperatureC,
    stoppedEarly: check.stoppedEarly,
    stopReason: check.stopReason,
    pulls: file.pulls.map((one) => pullFact(check.plan, one)),
    barred: barredReasons({ lockedReason: tester.lockedReason, certificate, proof, today }),
  };
}
