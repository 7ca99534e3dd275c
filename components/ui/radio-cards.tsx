import clsx from 'clsx';
import type { ComponentProps, ReactNode } from 'react';
import { Fieldset } from './fieldset';

export interface RadioCardOption {
  value: string;
  label: ReactNode;
  hint?: ReactNode;
  disabled?: boolean;
}

interface RadioCardsProps extends Omit<
  ComponentProps<'input'>,
  'type' | 'value' | 'defaultValue' | 'defaultChecked' | 'size' | 'className' | 'children'
> {
  legend: ReactNode;
  hint?: ReactNode;
  error?: string | undefined;
  name: string;
  options: readonly RadioCardOption[];
  /** Chosen at first (uncontrolled). */
  defaultValue?: string | undefined;
  /** Chosen now (controlled, with `onChange`). */
  value?: string | undefined;
  columns?: 1 | 2 | 3;
  size?: 'normal' | 'big';
  className?: string;
}

const columnClass = { 1: 'grid-cols-1', 2: 'grid-cols-2', 3: 'grid-cols-3' };

/** One choice of a few, each a card to tap. Native radio buttons: arrow keys, no script needed. */
export function RadioCards({
  legend,
  hint,
  error,
  name,
  options,
  defaultValue,
  value,
  columns = 1,
  size = 'normal',
  className,
  ...input
}: RadioCardsProps) {
  return (
    <Fieldset legend={legend} hint={hint} error={error} className={className}>
      <div className={clsx('grid gap-2.5', columnClass[columns])}>
        {options.map((option) => (
          <label
            key={option.value}
            className={clsx(
              'border-control flex items-center gap-3 rounded-lg border-2 px-3.5 py-2.5',
              'has-checked:border-fore has-checked:ring-fore has-checked:ring-2',
              'has-disabled:opacity-60',
              size === 'big' ? 'min-h-16 text-xl' : 'min-h-14',
            )}
          >
            <input
              {...input}
              type="radio"
              name={name}
              value={option.value}
              disabled={option.disabled || input.disabled}
              {...(value === undefined
                ? { defaultChecked: option.value === defaultValue }
                : { checked: option.value === value })}
              className="accent-ink size-5.5 shrink-0"
            />
            <span className="min-w-0">
              <span className="block leading-snug font-semibold">{option.label}</span>
              {option.hint && <span className="text-fore-quiet block">{option.hint}</span>}
            </span>
          </label>
        ))}
      </div>
    </Fieldset>
  );
}
