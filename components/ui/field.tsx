import clsx from 'clsx';
import type { ReactNode } from 'react';
import { FieldError } from './field-error';

/** What a field's words have in common. */
export interface FieldWords {
  label: ReactNode;
  /** One short line on what to enter. */
  hint?: ReactNode;
  /** What is wrong and what to do; empty or undefined when nothing is. */
  error?: string | undefined;
  /** Says '(optional)' beside the label. */
  optional?: boolean;
}

/** Attributes that tie a control to its label, hint and error. */
export interface ControlLinks {
  id: string;
  'aria-describedby': string | undefined;
  'aria-invalid': true | undefined;
}

/** The links for the control `id`: spread them on the input. */
export function controlLinks(id: string, words: Pick<FieldWords, 'hint' | 'error'>): ControlLinks {
  const described = [words.hint && `${id}-hint`, words.error && `${id}-error`].filter(Boolean);
  return {
    id,
    'aria-describedby': described.length > 0 ? described.join(' ') : undefined,
    'aria-invalid': words.error ? true : undefined,
  };
}

/** Label, hint and error around a control that carries `controlLinks(id, …)`. */
export function Field({
  id,
  label,
  hint,
  error,
  optional = false,
  className,
  children,
}: FieldWords & { id: string; className?: string | undefined; children: ReactNode }) {
  return (
    <div className={clsx('flex flex-col gap-1.5', className)}>
      <label htmlFor={id} className="font-semibold">
        {label}
        {optional && <span className="text-fore-quiet font-normal"> (optional)</span>}
      </label>
      {hint && (
        <p id={`${id}-hint`} className="text-fore-quiet -mt-1">
          {hint}
        </p>
      )}
      {children}
      <FieldError id={`${id}-error`} error={error} />
    </div>
  );
}

/** The shared look of text inputs and selects; 48 px high, wide edge when wrong. */
export const controlClass = clsx(
  'border-control text-ink min-h-12 w-full min-w-0 rounded-lg border-2 bg-white px-3 py-2',
  'aria-invalid:border-ink aria-invalid:border-l-8 disabled:opacity-60',
);
