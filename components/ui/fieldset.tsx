import clsx from 'clsx';
import { useId, type ComponentProps, type ReactNode } from 'react';
import { FieldError } from './field-error';

interface FieldsetProps extends ComponentProps<'fieldset'> {
  legend: ReactNode;
  hint?: ReactNode;
  error?: string | undefined;
  /** A legend as large as a section's heading, for a group of several questions. */
  heading?: boolean;
}

/** A group of controls under one question, with hint and error tied to the group. */
export function Fieldset({
  legend,
  hint,
  error,
  heading = false,
  className,
  children,
  ...rest
}: FieldsetProps) {
  const id = useId();
  const described = [hint && `${id}-hint`, error && `${id}-error`].filter(Boolean).join(' ');
  return (
    <fieldset
      {...rest}
      aria-describedby={described || undefined}
      className={clsx('flex min-w-0 flex-col gap-3', className)}
    >
      <legend
        className={heading ? 'font-code mb-3 text-2xl font-semibold' : 'mb-1.5 font-semibold'}
      >
        {legend}
      </legend>
      {hint && (
        <p id={`${id}-hint`} className="text-fore-quiet -mt-2">
          {hint}
        </p>
      )}
      {children}
      <FieldError id={`${id}-error`} error={error} />
    </fieldset>
  );
}
