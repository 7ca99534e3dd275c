import { parseDecimal } from '@/lib/line/join';
import type { CheckView } from '@/lib/live/contract';

/** What is asked of the operator for the pull in hand. */
export interface EntryNeeds {
  /** What the tester shows is typed. */
  value: boolean;
  /** What the tool's own display showed is typed. */
  toolValue: boolean;
  /** An empty value is fine: an exercise pull counts without one. */
  mayBeEmpty: boolean;
  /** 'accept', 'done', 'take' */
  verb: 'accept' | 'take' | 'done';
}

type EntryCheck = Pick<CheckView, 'setting' | 'step' | 'offered'>;

/** `types`: the tester sends nothing itself, or its values are typed for the time being. */
export function entryNeeds(check: EntryCheck, types: boolean): EntryNeeds | null {
  if (check.offered) {
    const reads = !check.setting && check.offered.kind === 'reading';
    return { value: false, toolValue: reads, mayBeEmpty: false, verb: 'accept' };
  }
  if (!check.step) return null;
  if (check.step.kind === 'exercise') {
    return { value: false, toolValue: false, mayBeEmpty: true, verb: 'done' };
  }
  if (!types) return null;
  return { value: true, toolValue: !check.setting, mayBeEmpty: false, verb: 'take' };
}

export interface EntryText {
  value: string;
  toolValue: string;
}

export interface EntryNumbers {
  value: number | null;
  toolValue: number | null;
}

export type EntryErrors = Partial<Record<keyof EntryText, string>>;

/** The typed text as numbers, or what is wrong with each field. The post checks all of it again. */
export function readEntry(
  text: EntryText,
  needs: EntryNeeds,
): { numbers: EntryNumbers } | { errors: EntryErrors } {
  const errors: EntryErrors = {};
  const numbers: EntryNumbers = { value: null, toolValue: null };
  for (const field of ['value', 'toolValue'] as const) {
    if (!needs[field]) continue;
    const number = parseDecimal(text[field]);
    if (number === null) errors[field] = 'Type this value.';
    else if (Number.isNaN(number)) errors[field] = 'This is no number.';
    else if (number < 0) errors[field] = 'A torque is not negative.';
    numbers[field] = number;
  }
  return Object.keys(errors).length > 0 ? { errors } : { numbers };
}
