import { z } from 'zod';
import type { PullSource } from '@/lib/line/states';
import type { CheckEvaluation } from '@/lib/torque/evaluation';
import type { PullFact, TesterFacts, ToolFacts } from '@/lib/torque/facts';
import type { CheckPlan, PlanStep } from '@/lib/torque/plan';
import { VERDICTS } from '@/lib/torque/verdict';
import type { AsFound } from './as-found';

export type { AsFound } from './as-found';

export const RECORD_FORMAT = 'pullpost-record';
export const RECORD_VERSION = 1;

/** A value as it comes back from canonical text: infinite degrees of freedom are null. */
type Recorded<T> = T extends (infer Item)[]
  ? Recorded<Item>[]
  : T extends object
    ? {
        [Key in keyof T]: Key extends 'dof' | 'effectiveDof' ? number | null : Recorded<T[Key]>;
      }
    : T;

export type RecordedEvaluation = Recorded<CheckEvaluation>;
export type RecordedPoint = RecordedEvaluation['points'][number];

/** The tool as its plate or its owner describes it. Torques in `unit`. */
export interface RecordedTool extends ToolFacts {
  toolId: string;
  nominal: number | null;
  measuresCcw: boolean;
  drive: string | null;
  maker: string | null;
  serial: string | null;
}

export interface RecordedTester extends TesterFacts {
  id: string;
  name: string;
  maker: string;
  model: string;
  serial: string;
}

export interface RecordedCertificate {
  id: string;
  number: string;
  laboratory: string;
  accreditation: string;
  /** YYYY-MM-DD. */
  issuedOn: string;
  dueOn: string;
  traceability: string;
  correctionApplied: boolean;
}

export interface RecordedProof {
  id: string;
  method: 'dead-weight' | 'comparison';
  loadNm: number;
  readingNm: number;
  limitPercent: number;
  /** ISO 8601 in UTC. */
  at: string;
  result: 'passed' | 'failed';
}

/** One pull whole, with everything that was decided about it. */
export interface RecordedPull extends PullFact {
  kind: PlanStep['kind'];
  direction: PlanStep['direction'];
  /** In the plan's unit. */
  target: number;
  /** rawNm + correctionNm; null for an exercise pull that nobody read. */
  referenceNm: number | null;
  source: PullSource;
  /** ISO 8601 in UTC. */
  at: string;
}

/**
 * A signed-off check: everything that its page, PDF and exports show, and no personal data (staff
 * and tools by id). Immutable; kept as its canonical text.
 */
export interface SignedRecord {
  format: typeof RECORD_FORMAT;
  version: typeof RECORD_VERSION;
  /** Post, year, sequence: 'QM-2026-0147'. */
  number: string;
  post: { id: string; name: string; shortName: string };
  meet: { id: string; name: string; place: string; startsOn: string; timeZone: string };
  checkId: string;
  tagCode: string;
  toolId: string;
  startedAt: string;
  signedAt: string;
  signedBy: { staffId: string };
  tool: RecordedTool;
  asFound: AsFound;
  plan: CheckPlan;
  planVersion: number;
  tester: RecordedTester;
  certificate: RecordedCertificate | null;
  proof: RecordedProof | null;
  barred: string[];
  temperatureC: number | null;
  pulls: RecordedPull[];
  notes: { at: string; text: string }[];
  evaluation: RecordedEvaluation;
  notFollowed: string[];
  stoppedEarly: boolean;
  stopReason: string | null;
  codeVersion: string;
}

const text = z.string().min(1);
const instant = z.iso.datetime();
const verdict = z.enum(VERDICTS);

/** The outline of a record: enough to know that the text is one. Its inside was made by `canonical`. */
const outline = z.looseObject({
  format: z.literal(RECORD_FORMAT),
  version: z.literal(RECORD_VERSION),
  number: text,
  post: z.looseObject({ id: text, name: text, shortName: text }),
  meet: z.looseObject({ id: text, name: text, timeZone: text }),
  tagCode: text,
  toolId: text,
  signedAt: instant,
  signedBy: z.strictObject({ staffId: text }),
  tool: z.looseObject({ toolClass: text, unit: text }),
  asFound: z.looseObject({}),
  plan: z.looseObject({ unit: text, basis: text, points: z.array(z.unknown()) }),
  planVersion: z.number(),
  tester: z.looseObject({ name: text }),
  certificate: z.looseObject({ number: text, dueOn: text }).nullable(),
  proof: z.looseObject({ method: text, result: text }).nullable(),
  pulls: z.array(z.looseObject({ id: text, stepIndex: z.number(), state: text })),
  evaluation: z.looseObject({
    verdict,
    simpleVerdict: verdict,
    statement: text,
    points: z.array(z.looseObject({ verdict, readings: z.array(z.unknown()) })),
  }),
  notFollowed: z.array(z.string()),
  stoppedEarly: z.boolean(),
  codeVersion: text,
});

const isRecord = (value: unknown): value is SignedRecord => outline.safeParse(value).success;

/**
 * A record from its canonical text.
 * @throws {RangeError} when the text is no JSON, or no record of this format and version; the
 * message names the first place that is wrong.
 */
export function parseRecord(canonicalText: string): SignedRecord {
  let value: unknown;
  try {
    value = JSON.parse(canonicalText);
  } catch {
    throw new RangeError('The text of the record is no JSON.');
  }
  if (isRecord(value)) return value;
  const issue = outline.safeParse(value).error?.issues[0];
  const where = issue?.path.length ? ` at ${issue.path.join('.')}` : '';
  throw new RangeError(`The text is no ${RECORD_FORMAT} of version ${RECORD_VERSION}${where}.`);
}
