import type { VoidFault } from './faults';
import type { Summary } from './deviation';
import type { DeliveredPoint } from './delivered';
import type { Direction } from './terms';
import type { Tolerance } from './tool';
import type { Combined } from './uncertainty';
import type { Verdict } from './verdict';

/** A code for programs and its words for people. */
export interface Reason {
  code: string;
  words: string;
}

export interface EvaluatedReading {
  pullId: string;
  /** In the plan's unit. */
  toolValue: number;
  referenceNm: number;
  /** Per cent of the plan's basis. */
  deviation: number;
  /** Beyond the limits, without the guard band. */
  beyond: boolean;
}

export interface VoidedReading {
  pullId: string;
  toolValue: number;
  referenceNm: number | null;
  deviation: number | null;
  fault: VoidFault | null;
  note: string | null;
}

export interface BudgetComponent {
  /** A short code. */
  name: string;
  label: string;
  /** Standard uncertainty, per cent of the target. */
  standard: number;
  dof: number;
}

export interface Budget {
  components: BudgetComponent[];
  combined: Combined;
  /** Size of a certificate error that is not corrected, per cent; added to `expanded`, linearly. */
  uncorrectedErrorPercent: number;
}

export interface PointEvaluation {
  direction: Direction;
  /** In the plan's unit. */
  target: number;
  targetNm: number;
  requiredReadings: number;
  readings: EvaluatedReading[];
  voided: VoidedReading[];
  /** Did an accepted pull end without a release? */
  noRelease: boolean;
  /** The highest torque by which the tool had not released. */
  noReleaseNm: number | null;
  /** Of the deviations, per cent. */
  summary: Summary | null;
  /** What the tool delivers when it says the target. */
  meanDelivered: { valueNm: number; expandedNm: number } | null;
  /** What is judged against; null below the claimed range. */
  limits: Tolerance | null;
  standardLimits: Tolerance;
  /** Expanded uncertainty of the reference with an uncorrected error, per cent; null uncertified. */
  referenceExpanded: number | null;
  /** Width of the guard band, per cent. */
  guardPercent: number | null;
  budget: Budget | null;
  /** What the budget leaves out, in words. */
  notAssessed: string[];
  /** Probability that the mean conforms (JCGM 106). */
  conformance: number | null;
  testUncertaintyRatio: number | null;
  verdict: Verdict;
  simpleVerdict: Verdict;
  reasons: Reason[];
  excluded: boolean;
}

export interface CheckEvaluation {
  points: PointEvaluation[];
  verdict: Verdict;
  simpleVerdict: Verdict;
  /** The verdict of the whole, in words. */
  statement: string;
  /** The first step without an offered or accepted pull; null when all are done. */
  nextStepIndex: number | null;
  /** Exercise pulls and readings together. */
  progress: { done: number; total: number };
  /** What a sign-off would lack, in words. */
  missing: string[];
  /** What of the plan and the standard was not followed, in words. */
  notFollowed: string[];
  /** For `delivered()`, a list a direction. */
  delivered: { direction: Direction; points: DeliveredPoint[] }[];
}
