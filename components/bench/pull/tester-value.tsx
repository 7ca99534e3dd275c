'use client';

import clsx from 'clsx';
import type { RefObject } from 'react';
import { TORQUE_UNITS, unitText, type TorqueUnit } from '@/lib/torque/units';
import { controlClass, controlLinks } from '../../ui/field';
import { FieldError } from '../../ui/field-error';
import type { Entry } from './use-entry';

/** The id of the field, for the Enter that goes on to it. */
export const TESTER_VALUE = 'tester-value';

/** The look of a number that is typed with gloves on and read from a step away. */
export const BIG_NUMBER = 'min-h-17 text-4xl font-bold';

interface TesterValueProps {
  field: RefObject<HTMLInputElement | null> | undefined;
  entry: Entry;
  unit: TorqueUnit;
  onUnit: (unit: TorqueUnit) => void;
}

/** What the tester's display shows, in the unit that it is set to. */
export function TesterValue({ field, entry, unit, onUnit }: TesterValueProps) {
  const error = entry.errors.value;
  return (
    <div className="flex min-w-0 flex-col gap-1.5">
      <div className="flex items-center justify-between gap-2">
        <label htmlFor={TESTER_VALUE} className="font-semibold whitespace-nowrap">
          Tester shows
        </label>
        <select
          aria-label="Unit of the tester’s display"
          value={unit}
          onChange={(event) => {
            const chosen = TORQUE_UNITS.find((one) => one === event.target.value);
            if (chosen) onUnit(chosen);
          }}
          className="border-control text-ink min-h-12 min-w-0 rounded-lg border-2 bg-white px-1"
        >
          {TORQUE_UNITS.map((one) => (
            <option key={one} value={one}>
              {unitText(one)}
            </option>
          ))}
        </select>
      </div>
      <input
        {...controlLinks(TESTER_VALUE, { hint: undefined, error })}
        ref={field}
        data-number
        type="text"
        inputMode="decimal"
        autoComplete="off"
        value={entry.text.value}
        readOnly={entry.unanswered}
        onChange={(event) => entry.type('value', event.target.value)}
        className={clsx(controlClass, 'font-reading', BIG_NUMBER)}
      />
      <FieldError id={`${TESTER_VALUE}-error`} error={error} />
    </div>
  );
}
