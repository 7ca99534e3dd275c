import { notNegative, oneOf, positive, range as checkRange, wholeNumber } from './assert';
import { exercisePullsOf, loadSeconds, readingsOf, schemeFacts, SCHEMES } from './schemes';
import type { Edition, Scheme } from './schemes';
import { targetsOf, type TargetInput } from './targets';
import { BASES, DIRECTIONS, type Basis, type Direction } from './terms';
import { isSettingTool, type ToolClass } from './tool';
import { convertTorque, formatTorque, TORQUE_UNITS, type TorqueUnit } from './units';

export type { Edition, Scheme } from './schemes';
export type { Basis, Direction } from './terms';
export { SCHEMES } from './schemes';

/** One pull of a plan. `target` is in the plan's unit; the times are from 80 % to 100 % of it. */
export interface PlanStep {
  kind: 'exercise' | 'reading';
  direction: Direction;
  target: number;
  minLoadSeconds: number;
  maxLoadSeconds: number | null;
}

export interface PlanPoint {
  direction: Direction;
  /** In the plan's unit. */
  target: number;
}

/** Everything that is pulled in a check, in order, and how it is judged. Targets in `unit`. */
export interface CheckPlan {
  scheme: Scheme;
  schemeName: string;
  edition: Edition;
  unit: TorqueUnit;
  toolClass: ToolClass;
  /** Type II: set beforehand, signals. */
  setting: boolean;
  basis: Basis;
  /** Guard band as a share of the reference's expanded uncertainty. */
  guard: number;
  isStandardSequence: boolean;
  /** How the plan was made, in words. */
  notes: string[];
  /** What of the standard's sequence it does not follow, in words. */
  departures: string[];
  /** Exercise pulls in each direction. */
  exercisePulls: number;
  readingsPerPoint: number;
  points: PlanPoint[];
  steps: PlanStep[];
}

export interface PlanInput extends TargetInput {
  directions: readonly Direction[];
  /** Default `reference`. */
  basis?: Basis;
  /** Default 1. */
  guard?: number;
  /** The tester that the tool will be pulled on, N·m. */
  testerRange?: { minNm: number; maxNm: number } | null;
  /** What a lead has changed of the scheme's own numbers. */
  overrides?: {
    exercisePulls?: number | null;
    readingsPerPoint?: number | null;
    percents?: readonly number[] | null;
  };
}

function refuseAbove(highest: number, input: PlanInput): void {
  const { unit, range, testerRange } = input;
  if (highest > range.max * (1 + 1e-9)) {
    throw new RangeError(
      `${formatTorque(highest, unit)} is above the tool’s range, which ends at ${formatTorque(range.max, unit)}.`,
    );
  }
  if (testerRange && convertTorque(highest, unit, 'N.m') > testerRange.maxNm * (1 + 1e-9)) {
    throw new RangeError(
      `${formatTorque(highest, unit)} is above the tester’s range, which ends at ${formatTorque(testerRange.maxNm, 'N.m')}.`,
    );
  }
}

function checkInput(input: PlanInput): void {
  oneOf(input.scheme, SCHEMES, 'The scheme');
  oneOf(input.unit, TORQUE_UNITS, 'The torque unit');
  oneOf(input.basis ?? 'reference', BASES, 'The basis');
  notNegative(input.guard ?? 1, 'The guard');
  checkRange(input.range, 'the tool’s range');
  if (input.division != null) positive(input.division, 'The division');
  if (input.directions.length === 0) throw new RangeError('A plan needs a direction.');
  for (const direction of input.directions) oneOf(direction, DIRECTIONS, 'The direction');
  if (input.testerRange) {
    const { minNm, maxNm } = input.testerRange;
    checkRange({ min: minNm, max: maxNm }, 'the tester’s range');
  }
}

/** A count of the scheme, or the lead's; a changed one departs from the standard. */
function changed(own: number, override: number | null | undefined, least: number, what: string) {
  if (override == null || override === own) return { count: own, departure: null };
  wholeNumber(override, least, what);
  return { count: override, departure: `${what}: ${override} instead of ${own}.` };
}

/**
 * The check plan of a tool: which set points, in which order, with which exercise pulls (ISO 6789-1).
 * Everything in `unit`. Each direction starts with its exercise pulls, then its points ascending.
 * @throws {RangeError} when it would pull above the tool's or the tester's range, when a working
 * point is outside the range, when a fixed tool has no nominal value, or for unknown words.
 */
export function buildPlan(input: PlanInput): CheckPlan {
  const setting = isSettingTool(input.toolClass);
  checkInput(input);
  const { name, edition, departure } = schemeFacts(input.scheme);
  const { targets, exerciseAt, notes, departures } = targetsOf(input, input.overrides?.percents);
  refuseAbove(Math.max(exerciseAt, ...targets), input);

  const exercise = changed(
    exercisePullsOf(input.scheme, input.toolClass),
    input.overrides?.exercisePulls,
    0,
    'Exercise pulls',
  );
  const readings = changed(
    readingsOf(input.scheme, input.toolClass),
    input.overrides?.readingsPerPoint,
    1,
    'Readings a point',
  );
  const allDepartures = [departure, ...departures, exercise.departure, readings.departure].filter(
    (words) => words !== null,
  );

  const step = (kind: PlanStep['kind'], direction: Direction, target: number): PlanStep => ({
    kind,
    direction,
    target,
    ...loadSeconds(edition, convertTorque(target, input.unit, 'N.m')),
  });
  const repeat = (count: number, one: PlanStep) =>
    Array.from({ length: count }, () => ({ ...one }));
  const directions = [...new Set(input.directions)];

  return {
    scheme: input.scheme,
    schemeName: name,
    edition,
    unit: input.unit,
    toolClass: input.toolClass,
    setting,
    basis: input.basis ?? 'reference',
    guard: input.guard ?? 1,
    isStandardSequence: allDepartures.length === 0,
    notes,
    departures: allDepartures,
    exercisePulls: exercise.count,
    readingsPerPoint: readings.count,
    points: directions.flatMap((direction) => targets.map((target) => ({ direction, target }))),
    steps: directions.flatMap((direction) => [
      ...repeat(exercise.count, step('exercise', direction, exerciseAt)),
      ...targets.flatMap((target) => repeat(readings.count, step('reading', direction, target))),
    ]),
  };
}
