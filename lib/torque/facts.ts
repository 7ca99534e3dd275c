import type { Claim } from './claim';
import type { VoidFault } from './faults';
import type { CheckPlan } from './plan';
import type { CertificatePoint } from './tester';
import type { ToolClass } from './tool';
import type { TorqueUnit } from './units';
import type { BarredReason } from './verdict';

/** The tester as it stood when the check began. Torques in N·m. */
export interface TesterFacts {
  minNm: number;
  maxNm: number;
  resolutionNm: number;
  points: CertificatePoint[];
  /** Is the certificate's error taken off each reading? */
  correctionApplied: boolean;
  /** Limit of drift in a year, ± per cent of reading. */
  yearlyDriftPercent: number;
  yearsSinceCertification: number;
  /** Per cent of reading for each kelvin away from the certificate's temperature. */
  temperatureCoefficientPercentPerK: number | null;
  certificateTemperatureC: number | null;
  /** How fast torque rises at release, and how often the tester looks; for peak sampling. */
  slopeNmPerSecond?: number | null;
  samplePeriodSeconds?: number | null;
}

export interface ToolFacts {
  toolClass: ToolClass;
  /** In `unit`. */
  range: { min: number; max: number };
  unit: TorqueUnit;
  /** Scale division or display step, in `unit`. */
  division: number | null;
  claim: Claim | null;
}

export interface PullFact {
  id: string;
  sequence: number;
  stepIndex: number;
  /** What the tool said, its setting or display, in the plan's unit. */
  toolValue: number;
  /** As the tester gave it; for a pull without release, the torque at which it was stopped. */
  rawNm: number | null;
  correctionNm: number;
  outcome: 'reading' | 'no-release';
  state: 'offered' | 'accepted' | 'voided';
  fault: VoidFault | null;
  note: string | null;
}

/** Everything that a check is judged from. */
export interface CheckFacts {
  plan: CheckPlan;
  tool: ToolFacts;
  tester: TesterFacts;
  /** Ambient, °C; null when it was not read. */
  temperatureC: number | null;
  pulls: PullFact[];
  barred: BarredReason[];
  stoppedEarly?: boolean;
  stopReason?: string | null;
}
