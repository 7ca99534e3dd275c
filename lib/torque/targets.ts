import { finite, positive } from './assert';
import { marksOf, type Marks } from './marks';
import type { Scheme } from './schemes';
import { isFixedTool, isWithoutScale, type ToolClass } from './tool';
import { formatNumber, formatTorque, type TorqueUnit } from './units';

/** What the set points of a plan follow from. All torques in `unit`. */
export interface TargetInput {
  toolClass: ToolClass;
  range: { min: number; max: number };
  unit: TorqueUnit;
  /** Scale division or display step; without one a target can be any value. */
  division?: number | null;
  /** The one value of a fixed tool, or what a tool without a scale was found set to. */
  nominal?: number | null;
  scheme: Scheme;
  /** The owner's own values, for `working`. */
  workingPoints?: readonly number[] | null;
}

export interface Targets {
  /** Ascending, without repeats. */
  targets: number[];
  exerciseAt: number;
  notes: string[];
  departures: string[];
}

const ascending = (values: readonly number[]): number[] =>
  [...new Set(values)].sort((a, b) => a - b);

function nominalOnly(input: TargetInput): Targets {
  const { range, unit, toolClass } = input;
  const nominal = input.nominal ?? (range.min === range.max ? range.max : null);
  if (nominal === null) throw new RangeError('A fixed tool needs its nominal value.');
  positive(nominal, 'The nominal value');
  if (nominal < range.min * (1 - 1e-9)) {
    throw new RangeError(
      `The nominal value ${formatTorque(nominal, unit)} is below the tool’s range.`,
    );
  }
  const words = isFixedTool(toolClass) ? 'its nominal value' : 'the value it was found set to';
  return {
    targets: [nominal],
    exerciseAt: nominal,
    notes: [`Checked at ${words} alone: ${formatTorque(nominal, unit)}.`],
    departures: [],
  };
}

function workingTargets(input: TargetInput, marks: Marks): Targets {
  const { range, unit } = input;
  const wanted = input.workingPoints ?? [];
  if (wanted.length === 0) throw new RangeError('A check at working points needs at least one.');
  const notes: string[] = [];
  const targets = wanted.map((value) => {
    positive(value, 'A working point');
    if (value < range.min * (1 - 1e-9) || value > range.max * (1 + 1e-9)) {
      throw new RangeError(
        `The working point ${formatTorque(value, unit)} is outside the tool’s range, ` +
          `${formatNumber(range.min)} to ${formatTorque(range.max, unit)}.`,
      );
    }
    const mark = marks.nearest(value);
    if (Math.abs(mark - value) > 1e-9 * value) {
      notes.push(
        `${formatTorque(value, unit)} lies between marks; ${formatTorque(mark, unit)} is checked.`,
      );
    }
    return mark;
  });
  const highest = Math.max(...targets);
  notes.push(
    `Exercise pulls are made at the highest chosen point, ${formatTorque(highest, unit)}.`,
  );
  return { targets: ascending(targets), exerciseAt: highest, notes, departures: [] };
}

const OWN_PERCENTS = [20, 60, 100] as const;

function percentTargets(
  input: TargetInput,
  marks: Marks,
  changed: readonly number[] | null | undefined,
): Targets {
  const { range, unit, scheme } = input;
  const percents = ascending(changed ?? OWN_PERCENTS);
  if (percents.length === 0) throw new RangeError('A plan needs at least one set point.');
  const notes: string[] = [];
  const targets = percents.map((percent, index) => {
    if (finite(percent, 'A set point in per cent') <= 0 || percent > 100) {
      throw new RangeError(
        `A set point of ${percent} % of the maximum is not above 0 and up to 100 %.`,
      );
    }
    const value = (percent / 100) * range.max;
    if (percent === 100) return marks.highest;
    if (index > 0) return marks.nearest(value);
    if (scheme === 'iso-2017' && !changed && range.min > 0) return marks.lowest;
    if (value < marks.lowest * (1 - 1e-9)) {
      notes.push(
        `${percent} % of the maximum is below the scale; its lowest value, ${formatTorque(marks.lowest, unit)}, is checked.`,
      );
    }
    return marks.atOrBelow(value);
  });
  const departures =
    changed && (percents.length !== 3 || percents.some((value, i) => value !== OWN_PERCENTS[i]))
      ? [`Set points at ${percents.join(', ')} % of the maximum.`]
      : [];
  return { targets: ascending(targets), exerciseAt: marks.highest, notes, departures };
}

/**
 * The set points of a plan and where it exercises, in the tool's unit. 20 % rounds down to a mark,
 * 60 % to the nearest (ties down), 100 % is the highest mark (ISO 6789-1).
 * @throws {RangeError} when there is no such set point inside the tool's range.
 */
export function targetsOf(input: TargetInput, percents?: readonly number[] | null): Targets {
  const found = isWithoutScale(input.toolClass) && input.nominal != null;
  if (isFixedTool(input.toolClass) || (found && input.scheme !== 'working')) {
    return nominalOnly(input);
  }
  const marks = marksOf(input.range, input.division);
  if (input.scheme === 'working') return workingTargets(input, marks);
  return percentTargets(input, marks, percents);
}
