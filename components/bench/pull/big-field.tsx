'use client';

import clsx from 'clsx';
import type { KeyboardEvent, ReactNode, RefObject } from 'react';
import { controlClass } from '../../ui/field';
import { ENTRY_MESSAGE } from './entry-message';

interface BigFieldProps {
  id: string;
  label: string;
  /** Beside the label, such as the choice of its unit. */
  aside?: ReactNode;
  field?: RefObject<HTMLInputElement | null> | undefined;
  value: string;
  readOnly: boolean;
  /** What is wrong with it stands in the message above the fields. */
  invalid: boolean;
  onType: (typed: string) => void;
  onKeyDown?: (event: KeyboardEvent<HTMLInputElement>) => void;
}

/** A number that is typed with gloves on and read from a step away. */
export function BigField(props: BigFieldProps) {
  const { id, label, aside, field, invalid, onType, ...input } = props;
  return (
    <div className="flex min-w-0 flex-col gap-1.5">
      <div className="flex min-h-12 items-center justify-between gap-2">
        <label htmlFor={id} className="font-semibold whitespace-nowrap">
          {label}
        </label>
        {aside}
      </div>
      <input
        {...input}
        id={id}
        ref={field}
        data-number
        type="text"
        inputMode="decimal"
        autoComplete="off"
        aria-invalid={invalid || undefined}
        aria-describedby={invalid ? ENTRY_MESSAGE : undefined}
        onChange={(event) => onType(event.target.value)}
        className={clsx(controlClass, 'font-reading min-h-17 text-4xl font-bold')}
      />
    </div>
  );
}
